import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { HouseSheetPage } from '@/components/house/house-sheet-page';
import { requireHousehold } from '@/lib/auth/page-gate';
import { ClientMessages } from '@/lib/messages/client-messages';
import { showHouseSheet } from '@/lib/services/show-house-sheet';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('house');
  return { title: t('title') };
}

export default async function SheetPage({ searchParams }: { searchParams: Promise<{ for?: string | string[] }> }) {
  const visit = await requireHousehold();
  const { for: asked } = await searchParams;
  const sheet = await showHouseSheet(visit, typeof asked === 'string' ? asked : undefined);
  return (
    <ClientMessages namespaces={['house', 'doses', 'units', 'week', 'events']}>
      <HouseSheetPage sheet={sheet} />
    </ClientMessages>
  );
}
