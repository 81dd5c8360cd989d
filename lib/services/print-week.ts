import 'server-only';
import { assertMay } from '@/lib/auth/permissions';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { PrintedWeek } from '@/lib/schemas/printed-week';
import type { WeekQuery } from '@/lib/schemas/week-query';
import { DAYS_OF_A_PLAN } from '@/lib/schemas/week-ahead';
import type { ServiceContext } from './context';
import { countingDoses } from './sheet-doses';
import { showHouseNotes } from './show-house-notes';
import { showWeek } from './show-week';

const DAY = 86_400_000;

/**
 * A week as it is put on paper. The doses that nobody has ticked are those of now, also where another week is printed: each
 * of them changes what that week asks for.
 */
export async function printWeek(context: ServiceContext, query: WeekQuery = {}): Promise<PrintedWeek> {
  const { db, access, now } = context;
  assertMay(access, 'look');
  const week = await showWeek(context, query);
  const doses = await countingDoses(db, {
    householdId: access.householdId,
    from: new Date(now.getTime() - DAYS_OF_A_PLAN * DAY),
    until: new Date(now.getTime() + DAYS_OF_A_PLAN * DAY),
    lastReading: week.lastReading && new Date(week.lastReading.takenAt),
  });
  return {
    week,
    notes: (await showHouseNotes(context)).notes,
    openDoses: doses
      .filter(({ status }) => status === 'planned')
      .map(({ at }) => toOffsetIso(at.getTime(), access.timeZone)),
  };
}
