import type { Metadata } from 'next';
import { getTranslations } from 'next-intl/server';
import { headers } from 'next/headers';
import { userAgent } from 'next/server';
import { WaitingTests } from '@/components/readings/waiting-tests';
import { FirstSheetTour } from '@/components/tour/first-sheet';
import { PrintElsewhere } from '@/components/week-print/print-elsewhere';
import { WeekSheetScreen } from '@/components/week-sheet/week-sheet-screen';
import { findHousehold, requireHousehold } from '@/lib/auth/page-gate';
import { firstWeekday } from '@/lib/calendar/first-weekday';
import { dayRange } from '@/lib/calendar/format';
import { weekOf } from '@/lib/calendar/household-day';
import { ClientMessages } from '@/lib/messages/client-messages';
import { weekAskedFor, type WeekAddress } from '@/lib/schemas/week-query';
import { forPage } from '@/lib/services/for-page';
import { showWeek } from '@/lib/services/show-week';

type Props = { searchParams: Promise<WeekAddress> };

/** Whoever goes through the weeks is told by the title which one it is. */
export async function generateMetadata({ searchParams }: Props): Promise<Metadata> {
  const t = await getTranslations('week');
  const { start } = weekAskedFor(await searchParams);
  const visit = await findHousehold();
  if (start === undefined || visit === null) return { title: t('title') };
  const days = weekOf(start, firstWeekday(visit.access.locale));
  const range = dayRange(days[0] ?? start, days.at(-1) ?? start, visit.access.locale, t('rangeJoiner'));
  return { title: t('titleOf', { days: range }) };
}

/** The sheet comes with the page, so that the swim verdict is the first thing to be seen. */
export default async function WeekPage({ searchParams }: Props) {
  const visit = await requireHousehold();
  const { householdId, personId, personName, role, handlesChemicals, timeZone, locale, unitSystem, tourOpen } =
    visit.access;
  const asked = weekAskedFor(await searchParams);
  const initial = await forPage(showWeek(visit, asked));
  const onPhone = userAgent({ headers: await headers() }).device.type === 'mobile';
  return (
    <ClientMessages
      namespaces={['week', 'events', 'verdict', 'doses', 'units', 'readings', 'try-out']}
      parts={{ situations: ['kind', 'step', 'steps'] }}
    >
      <div className="print:hidden">
        <WaitingTests
          household={{ householdId, personId, personName, role, handlesChemicals, timeZone, locale, unitSystem }}
        />
        <WeekSheetScreen start={asked.start} initial={initial} onPhone={onPhone} />
      </div>
      {tourOpen && initial?.plan ? (
        <ClientMessages namespaces={['tour']}>
          <FirstSheetTour />
        </ClientMessages>
      ) : null}
      <PrintElsewhere />
    </ClientMessages>
  );
}
