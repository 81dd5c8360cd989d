import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { HowUnknown } from '@/components/help/how/how-unknown';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('how.unknown');
  return { title: t('title') };
}

export default function UnknownPage() {
  return <HowUnknown />;
}
