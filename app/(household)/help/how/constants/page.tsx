import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { HowConstants } from '@/components/help/how/how-constants';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('how.sources');
  return { title: t('title') };
}

export default function ConstantsPage() {
  return <HowConstants />;
}
