import 'server-only';
import { findCurrentPlan, findLatestPlanFailure, insertPlanFailure, type StoredPlan } from '@/db/queries/plans';
import { supersedeCurrentPlan } from '@/db/queries/plan-history';
import { inWriteTransaction } from '@/db/write';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { AppError, type ErrorCode } from '@/lib/errors';
import { logFault } from '@/lib/log';
import { ENGINE_VERSION } from '@/lib/planner/version';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Database } from '@/db/client';
import { learnPool } from './learn-pool';
import { inputHashOf, makePlan } from './make-plan';
import { sharedRun } from './shared-run';
import { storePlan } from './store-plan';
import { loadWeekSnapshot, type WeekSnapshot } from './week-snapshot';

/** The newest plan, and why there is no newer one when there should be. */
export type PlanOutcome = { plan: StoredPlan | null; problem: PlanProblem | null };
export type PlanProblem = { code: string; errorId: string };

export type PlanningContext = {
  db: Database;
  access: Pick<HouseholdAccess, 'householdId' | 'timeZone'>;
  now: Date;
};

const tries = 5;
/** What the same inputs will bring about again. Anything else is tried again, a minute later at the earliest. */
const lastingCodes: readonly string[] = ['plan-refused', 'water-out-of-range', 'invalid-input'] satisfies ErrorCode[];
const passingFaultCountsFor = 60_000;

/**
 * Brings the household's plan up to date with what is known: unchanged inputs keep the plan, others make a new version.
 * How time passes changes nothing.
 *
 * Plans that are asked for at once may come in any order: one is stored only while what it was made from still stands,
 * otherwise it is made again. A fault costs a plan and nothing else: the old one stays, with the id of the fault.
 */
export function planWeek(context: PlanningContext): Promise<PlanOutcome> {
  return sharedRun(context.access.householdId, () => bringUpToDate(context));
}

async function bringUpToDate(context: PlanningContext): Promise<PlanOutcome> {
  for (let attempt = 0; attempt < tries; attempt++) {
    const outcome = await tryToPlan(context);
    if (outcome) return outcome;
  }
  // Something changes faster than we plan; whatever changes last plans for itself.
  return { plan: await findCurrentPlan(context.db, context.access.householdId), problem: null };
}

async function tryToPlan({ db, access, now }: PlanningContext): Promise<PlanOutcome | undefined> {
  const { householdId, timeZone } = access;
  await learnPool({ db, access, now });
  const snapshot = await loadWeekSnapshot(db, householdId, timeZone);
  const plan = await findCurrentPlan(db, householdId);
  if (!snapshot) return plan ? withoutPlan({ db, access, now }) : { plan: null, problem: null };
  const inputHash = inputHashOf(snapshot);
  if (plan?.inputHash === inputHash) return { plan, problem: null };

  const failure = await findLatestPlanFailure(db, householdId);
  if (failure?.inputHash === inputHash && stillCounts(failure, now))
    return { plan, problem: { code: failure.code, errorId: failure.id } };

  let result: WeekPlan;
  try {
    result = await makePlan(snapshot, now);
  } catch (error) {
    const errorId = logFault(error, { task: 'plan-week', householdId, inputHash });
    const code = error instanceof AppError ? error.code : 'unexpected';
    await insertPlanFailure(db, householdId, {
      id: errorId,
      code,
      engineVersion: ENGINE_VERSION,
      inputHash,
      failedAt: now,
    });
    return { plan, problem: { code, errorId } };
  }
  return storeWhileItStands({ db, access, now }, { snapshot, inputHash, result });
}

async function storeWhileItStands(
  { db, access, now }: PlanningContext,
  made: { snapshot: WeekSnapshot; inputHash: string; result: WeekPlan },
): Promise<PlanOutcome | undefined> {
  return inWriteTransaction(db, async (tx) => {
    const snapshot = await loadWeekSnapshot(tx, access.householdId, access.timeZone);
    if (!snapshot || inputHashOf(snapshot) !== made.inputHash) return undefined;
    const current = await findCurrentPlan(tx, access.householdId);
    if (current?.inputHash === made.inputHash) return { plan: current, problem: null };
    return { plan: await storePlan(tx, access, { ...made, now }), problem: null };
  });
}

function stillCounts({ code, failedAt }: { code: string; failedAt: Date }, now: Date): boolean {
  return lastingCodes.includes(code) || now.getTime() - failedAt.getTime() < passingFaultCountsFor;
}

/** What the last plan was made from is gone (a deleted reading, a pool out of scope): it must not be followed any more. */
async function withoutPlan({ db, access, now }: PlanningContext): Promise<PlanOutcome | undefined> {
  return inWriteTransaction(db, async (tx) => {
    if (await loadWeekSnapshot(tx, access.householdId, access.timeZone)) return undefined;
    await supersedeCurrentPlan(tx, access.householdId, now);
    return { plan: null, problem: null };
  });
}
