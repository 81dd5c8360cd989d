import 'server-only';
import { sharedEngine } from '@/lib/engine-worker/shared-engine';
import { AppError, type ErrorCode } from '@/lib/errors';
import { planWithout } from '@/lib/planner/bare-plan';
import { ENGINE_VERSION } from '@/lib/planner/version';
import type { CautionCode } from '@/lib/planner/codes';
import type { Scenario } from '@/lib/schemas/scenario';
import type { WeekPlan } from '@/lib/schemas/plan';
import { identityOf } from './plan-identity';
import type { WeekSnapshot } from './week-snapshot';

const MINUTE = 60_000;
/** What a wish that no longer fits brings about. */
const ofTheWishes: readonly ErrorCode[] = ['plan-refused', 'invalid-input'];

/** Name of what a plan is made from: the engine's version and the snapshot; a row's own id makes no difference to it. */
export function inputHashOf({ readingId: _id, ...inputs }: WeekSnapshot): string {
  return identityOf({ engineVersion: ENGINE_VERSION, inputs });
}

/** The plan for a snapshot, made in the engine's thread. Rejects as `Engine.run` does. */
export async function makePlan(snapshot: WeekSnapshot, now: Date): Promise<WeekPlan> {
  if (snapshot.zeroDoubt) return planOnHold(snapshot, snapshot.zeroDoubt);
  const { task, lead } = snapshot;
  if (task === 'project') return sharedEngine().run('project', { ...snapshot.scenario, doses: [] });
  const scenario = scenarioAt(snapshot, now);
  return lead ? sharedEngine().run('lead', { scenario, lead }) : planAroundWishes(scenario);
}

/** The scenario as it is planned at an instant. */
export function scenarioAt(snapshot: WeekSnapshot, now: Date): Scenario {
  return { ...snapshot.scenario, now: earliestDose(snapshot, now).toISOString() };
}

/** What the household wished may break a limit since the water was tested again or the shelf counted: then it gives way. */
async function planAroundWishes(scenario: Scenario): Promise<WeekPlan> {
  try {
    return await sharedEngine().run('plan', scenario);
  } catch (error) {
    if (!scenario.wishes || !(error instanceof AppError) || !ofTheWishes.includes(error.code)) throw error;
    const { wishes: _wishes, ...rest } = scenario;
    const plan = await sharedEngine().run('plan', rest);
    return { ...plan, cautions: [{ code: 'wishes-set-aside' satisfies CautionCode }, ...plan.cautions] };
  }
}

/** Nothing is planned before now, nor in the hour of a dose that somebody decided against. */
function earliestDose({ skipped }: WeekSnapshot, now: Date): Date {
  const afterSkipped = skipped.map((at) => Date.parse(at) + MINUTE);
  return new Date(Math.max(now.getTime(), ...afterSkipped));
}

/** Nothing is added on the strength of a reading that may mean none or far too much: the next test decides. */
function planOnHold({ scenario }: WeekSnapshot, { doubt, takenAt }: NonNullable<WeekSnapshot['zeroDoubt']>): WeekPlan {
  return planWithout(scenario, [
    {
      code: doubt === 'open' ? 'false-zero-open' : 'chlorine-bleached-test',
      // Not a measurement that is missing: one that is in doubt.
      quantity: 'false-zero',
      since: takenAt,
    },
  ]);
}
