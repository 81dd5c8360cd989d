import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { SafetyCard } from '@/components/help/safety-card';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('help.safety');
  return { title: t('title') };
}

export default function SafetyPage() {
  return <SafetyCard />;
}
