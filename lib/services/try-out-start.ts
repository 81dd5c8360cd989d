import 'server-only';
import { listDoses } from '@/db/queries/plan-doses';
import type { StoredPlan } from '@/db/queries/plans';
import { dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { sharedEngine } from '@/lib/engine-worker/shared-engine';
import { AppError } from '@/lib/errors';
import type { PlanAhead } from '@/lib/planner/wishes-of';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import type { ServiceContext } from './context';
import { inputHashOf, scenarioAt } from './make-plan';
import { planWeek } from './plan-week';
import { loadWeekSnapshot } from './week-snapshot';

export type LoadedStart = PlanAhead & {
  plan: StoredPlan;
  readingId: string;
  inputHash: string;
  scenario: Scenario;
  mostTablets: number;
  /** First and last day that can be tried: from today to the end of the plan. */
  days: { first: string; last: string };
};

/**
 * The plan that stands, brought up to date, and what can be tried on it.
 *
 * Error: `conflict` while there is no plan that a household could change.
 */
export async function loadTryOutStart(context: ServiceContext): Promise<LoadedStart> {
  const { db, access, now } = context;
  const { householdId, timeZone } = access;
  const { plan, problem } = await planWeek(context);
  const snapshot = await loadWeekSnapshot(db, householdId, timeZone);
  if (!plan || !snapshot)
    throw new AppError('conflict', 'There is no plan yet to try anything on. Test the water first.');
  if (snapshot.task === 'project')
    throw new AppError('conflict', 'For this pool only a record is kept: there is no plan to change.');
  if (snapshot.lead)
    throw new AppError(
      'conflict',
      'An open situation leads this week. Its steps come first: end it before changing the plan.',
    );
  if (snapshot.zeroDoubt || problem || now >= plan.endsAt)
    throw new AppError('conflict', 'This plan no longer fits what is known of the water. Test again, then try it.');

  const scenario = scenarioAt(snapshot, now);
  const doses = await listDoses(db, { householdId, from: now, until: plan.endsAt });
  return {
    plan,
    readingId: snapshot.readingId,
    inputHash: inputHashOf(snapshot),
    scenario,
    ...(await sharedEngine().run('openings', scenario)),
    doses: doses
      .filter(({ planId, status }) => planId === plan.id && status === 'planned')
      .map(({ id, at, productId, toBuy, substance, form, amount, unit, rise, effect, reason }) => ({
        ...{ id, toBuy, substance, form, amount, unit, rise, reason },
        at: toOffsetIso(at.getTime(), timeZone),
        // A dose that the shelf no longer holds is kept without its product; the plan knows which it is.
        product: productId ?? plannedProduct(plan.result, { at, substance }),
        ...(effect === null ? {} : { effect }),
      })),
    days: { first: dayOf(now.getTime(), timeZone), last: dayOf(plan.endsAt.getTime() - 1, timeZone) },
  };
}

function plannedProduct({ doses }: WeekPlan, dose: { at: Date; substance: PlannedDose['substance'] }): string | null {
  const same = doses.find(({ at, substance }) => Date.parse(at) === dose.at.getTime() && substance === dose.substance);
  return same?.product ?? null;
}
