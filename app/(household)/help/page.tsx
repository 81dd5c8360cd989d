import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { HelpIndex } from '@/components/help/help-index';
import { findHousehold } from '@/lib/auth/page-gate';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('help');
  return { title: t('title') };
}

export default async function HelpPage() {
  const visit = await findHousehold();
  return <HelpIndex member={visit?.access.poolCompleted ?? false} signedIn={visit !== null} />;
}
