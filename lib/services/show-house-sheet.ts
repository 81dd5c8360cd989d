import 'server-only';
import { assertMay } from '@/lib/auth/permissions';
import { addDays } from '@/lib/calendar/household-day';
import type { HouseSheet } from '@/lib/schemas/house-sheet';
import { DAYS_OF_A_PLAN } from '@/lib/schemas/week-ahead';
import type { ServiceContext } from './context';
import { listChemicalHandlers } from './list-chemical-handlers';
import { countingDoses } from './sheet-doses';
import { showHouseNotes } from './show-house-notes';
import { showWeek } from './show-week';

const DAY = 86_400_000;

/**
 * The sheet for whoever looks after the pool while the household is away. Doses stand on it only for a member who handles
 * chemicals now: asked for anybody else, or for nobody, it has none.
 *
 * @param membershipId for whom the sheet is
 */
export async function showHouseSheet(context: ServiceContext, membershipId?: string): Promise<HouseSheet> {
  const { db, access, now } = context;
  assertMay(access, 'look');
  const { householdId } = access;
  const week = await showWeek(context);
  // A plan runs into the next calendar week.
  const next = await showWeek(context, { start: addDays(week.days[0]?.day ?? '', week.days.length) });
  const handlers = await listChemicalHandlers(context);
  const handler = handlers.find((each) => each.membershipId === membershipId) ?? null;
  const ahead = [...week.doses, ...next.doses].filter(
    ({ at, planId, status }) => status === 'planned' && planId === week.plan?.id && Date.parse(at) > now.getTime(),
  );
  const holds = week.plan !== null && !week.plan.stale;
  const due = await countingDoses(db, {
    householdId,
    from: new Date(now.getTime() - DAYS_OF_A_PLAN * DAY),
    until: now,
    lastReading: week.lastReading && new Date(week.lastReading.takenAt),
  });
  return {
    // The curves are drawn on the week sheet only.
    week: { ...week, behind: null, ahead: null },
    notes: (await showHouseNotes(context)).notes,
    handlers,
    handler,
    doses: handler === null || !holds ? [] : ahead,
    openDoses: due.filter(({ status }) => status === 'planned').length,
  };
}
