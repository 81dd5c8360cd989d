import 'server-only';
import { listChemicalHandlers } from '@/db/queries/memberships';
import { safetyCardCounts } from '@/lib/auth/household-access';
import { assertMay } from '@/lib/auth/permissions';
import { addDays } from '@/lib/calendar/household-day';
import type { HouseSheet } from '@/lib/schemas/house-sheet';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { ServiceContext } from './context';
import { showHouseNotes } from './show-house-notes';
import { showWeek } from './show-week';

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
  const marked = await listChemicalHandlers(db, householdId, now);
  const handlers = marked
    .filter(({ safetyCardReadAt }) => safetyCardCounts(safetyCardReadAt, now))
    .map(({ membershipId: id, name }) => ({ membershipId: id, name }));
  const handler = handlers.find((each) => each.membershipId === membershipId) ?? null;
  const planned = [...week.doses, ...next.doses].filter(({ status }) => status === 'planned');
  const isAhead = ({ at }: PlanDose) => Date.parse(at) > now.getTime();
  const holds = week.plan !== null && !week.plan.stale;
  return {
    // The curves are drawn on the week sheet only.
    week: { ...week, behind: null, ahead: null },
    notes: (await showHouseNotes(context)).notes,
    handlers,
    handler,
    doses: handler === null || !holds ? [] : planned.filter((dose) => isAhead(dose) && dose.planId === week.plan?.id),
    openDoses: planned.filter((dose) => !isAhead(dose)).length,
  };
}
