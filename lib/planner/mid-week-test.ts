import { HOURS_IN_PLAN, MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import type { PlanContext } from './context';
import { type Evaluated, levelsOf, lowestLevelsOf, riskOf } from './cost';
import { weights } from './weights';

/** A full test stands in the middle of the week at the earliest so long after the reading [h]. */
export const MID_WEEK_FROM = 72;

/** Whether a morning [ms] may hold that test. */
export function isMidWeek(at: number, { start }: Pick<PlanContext, 'start'>): boolean {
  return at >= start.takenAt + MID_WEEK_FROM * MILLISECONDS_PER_HOUR;
}

/**
 * Whether a full test in the middle of the week is worth more than it costs. What it can save at most is what not knowing
 * the pool costs from the first morning on that may hold it: the risk expected over the ensemble less that of its middle, which is what a plan made
 * anew could steer by.
 */
export function midWeekTestPays(plan: Evaluated, context: PlanContext): boolean {
  const { steadiness, evenings } = context.scenario.preferences;
  const morning = context.hours.findIndex(
    (hour, index) =>
      isMidWeek(hour, context) && context.swimHour[index] === true && context.swimHour[index - 1] === false,
  );
  if (morning < 0) return false;
  const lowest = lowestLevelsOf(plan, context).subarray(morning);
  const rest = { swimCeiling: context.swimCeiling.subarray(morning), swimHour: context.swimHour.slice(morning) };
  const riskFrom = (levels: Float64Array) => {
    const columns = levels.length / (HOURS_IN_PLAN + 1);
    const { shortfall, excess } = riskOf(levels.subarray(morning * columns), lowest, rest);
    return shortfall + excess;
  };
  const courses = plan.courses.map(({ hourly }) => hourly.freeChlorine);
  const saved = riskFrom(levelsOf(plan.middle, courses)) - riskFrom(levelsOf(plan.middle, [plan.middle]));
  return steadiness * saved > evenings * weights.fullTest;
}
