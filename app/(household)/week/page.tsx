import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { WeekSheetScreen } from '@/components/week-sheet/week-sheet-screen';
import { requireHousehold } from '@/lib/auth/page-gate';
import { ClientMessages } from '@/lib/messages/client-messages';
import { calendarDaySchema } from '@/lib/schemas/time';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('week');
  return { title: t('title') };
}

export default async function WeekPage({ searchParams }: { searchParams: Promise<{ start?: string | string[] }> }) {
  await requireHousehold();
  const asked = calendarDaySchema.safeParse((await searchParams).start);
  return (
    <ClientMessages namespaces={['week', 'verdict', 'doses', 'units']}>
      <WeekSheetScreen start={asked.success ? asked.data : undefined} />
    </ClientMessages>
  );
}
