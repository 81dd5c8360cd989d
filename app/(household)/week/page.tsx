import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { WaitingTests } from '@/components/readings/waiting-tests';
import { WeekSheetScreen } from '@/components/week-sheet/week-sheet-screen';
import { requireHousehold } from '@/lib/auth/page-gate';
import { AppError } from '@/lib/errors';
import { ClientMessages } from '@/lib/messages/client-messages';
import { calendarDaySchema } from '@/lib/schemas/time';
import { showWeek } from '@/lib/services/show-week';

export async function generateMetadata(): Promise<Metadata> {
  const t = await getTranslations('week');
  return { title: t('title') };
}

/** The sheet comes with the page, so that the swim verdict is the first thing to be seen. */
export default async function WeekPage({ searchParams }: { searchParams: Promise<{ start?: string | string[] }> }) {
  const visit = await requireHousehold();
  const { householdId, personId, personName, role, handlesChemicals, timeZone, locale, unitSystem } = visit.access;
  const asked = calendarDaySchema.safeParse((await searchParams).start);
  const start = asked.success ? asked.data : undefined;
  const initial = await showWeek(visit, start === undefined ? {} : { start }).catch((problem: unknown) => {
    // The browser asks again and says in words what is wrong.
    if (problem instanceof AppError) return undefined;
    throw problem;
  });
  return (
    <ClientMessages
      namespaces={['week', 'events', 'verdict', 'doses', 'units', 'readings']}
      parts={{ situations: ['kind', 'step', 'steps'] }}
    >
      <WaitingTests
        household={{ householdId, personId, personName, role, handlesChemicals, timeZone, locale, unitSystem }}
      />
      <WeekSheetScreen start={start} initial={initial} />
    </ClientMessages>
  );
}
