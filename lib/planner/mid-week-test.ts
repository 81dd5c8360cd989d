import { HOURS_IN_PLAN } from '@/lib/projection/forcing';
import type { PlanContext } from './context';
import { type Evaluated, levelsOf, lowestLevelsOf, riskOf } from './cost';
import { weights } from './weights';

/** A full test stands in the middle of the week at the earliest so long after the reading [h]. */
export const MID_WEEK_FROM = 72;

/**
 * Whether a full test in the middle of the week is worth more than it costs. What it can save at most is what not knowing
 * the pool costs from then on: the risk expected over the ensemble less that of its middle, which is what a plan made
 * anew could steer by.
 */
export function midWeekTestPays(plan: Evaluated, context: PlanContext): boolean {
  const { steadiness, evenings } = context.scenario.preferences;
  const lowest = lowestLevelsOf(plan, context).subarray(MID_WEEK_FROM);
  const rest = {
    swimCeiling: context.swimCeiling.subarray(MID_WEEK_FROM),
    swimHour: context.swimHour.slice(MID_WEEK_FROM),
  };
  const riskFrom = (levels: Float64Array) => {
    const columns = levels.length / (HOURS_IN_PLAN + 1);
    const { shortfall, excess } = riskOf(levels.subarray(MID_WEEK_FROM * columns), lowest, rest);
    return shortfall + excess;
  };
  const courses = plan.courses.map(({ hourly }) => hourly.freeChlorine);
  const saved = riskFrom(levelsOf(plan.middle, courses)) - riskFrom(levelsOf(plan.middle, [plan.middle]));
  return steadiness * saved > evenings * weights.fullTest;
}
