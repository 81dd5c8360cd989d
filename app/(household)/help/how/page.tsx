import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { HowIndex } from '@/components/help/how/how-index';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('how');
  return { title: t('title') };
}

export default function HowIndexPage() {
  return <HowIndex />;
}
