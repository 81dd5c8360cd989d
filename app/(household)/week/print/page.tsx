import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { WeekPrintPage } from '@/components/week-print/week-print-page';
import { requireHousehold } from '@/lib/auth/page-gate';
import { ClientMessages } from '@/lib/messages/client-messages';
import { calendarDaySchema } from '@/lib/schemas/time';
import { printWeek } from '@/lib/services/print-week';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('week-print');
  return { title: t('title') };
}

export default async function PrintPage({ searchParams }: { searchParams: Promise<{ start?: string | string[] }> }) {
  const visit = await requireHousehold();
  const asked = calendarDaySchema.safeParse((await searchParams).start);
  const start = asked.success ? asked.data : undefined;
  const printed = await printWeek(visit, start === undefined ? {} : { start });
  return (
    <ClientMessages
      namespaces={['week-print', 'week', 'events', 'verdict', 'doses', 'units']}
      parts={{ situations: ['kind', 'step', 'steps'], house: ['sheet'] }}
    >
      <WeekPrintPage printed={printed} start={start} />
    </ClientMessages>
  );
}
