import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { HelpIndex } from '@/components/help/help-index';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('help');
  return { title: t('title') };
}

export default function HelpPage() {
  return <HelpIndex />;
}
