import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { WeekPrintPage } from '@/components/week-print/week-print-page';
import { requireHousehold } from '@/lib/auth/page-gate';
import { ClientMessages } from '@/lib/messages/client-messages';
import { weekAskedFor, type WeekAddress } from '@/lib/schemas/week-query';
import { printWeek } from '@/lib/services/print-week';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('week-print');
  return { title: t('title') };
}

export default async function PrintPage({ searchParams }: { searchParams: Promise<WeekAddress> }) {
  const visit = await requireHousehold();
  const asked = weekAskedFor(await searchParams);
  const printed = await printWeek(visit, asked);
  return (
    <ClientMessages
      namespaces={['week-print', 'week', 'events', 'verdict', 'doses', 'units']}
      parts={{ situations: ['kind', 'step', 'steps'], house: ['sheet'] }}
    >
      <WeekPrintPage printed={printed} start={asked.start} />
    </ClientMessages>
  );
}
