import { dayOf } from '@/lib/calendar/household-day';
import { seriesOf } from '@/lib/projection';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Alternative } from '@/lib/schemas/plan';
import { lowestLevel } from '@/lib/standards/limits';
import type { PlanContext } from './context';
import { byMedian, type ByMedian, type Evaluated, moneyOf, stabilizedIn } from './cost';
import { type Choice, emptyDraft, visitsOf } from './draft';
import { plannedDoses } from './planned-doses';
import { sketchAlone } from './sketch';
import type { WeekSketch } from './week-sketch';

/**
 * The best week with each form alone: what the household gives up or gains against the plan's mix. Each is projected in full
 * for the median; what it costs over the ensemble is the quick model's figure, made to agree with the plan.
 */
export function alternativesOf({ context, options, choice, response, sketches }: WeekSketch, plan: Evaluated) {
  const without: Choice = { ...choice, tablets: null };
  const cost = response.costAround(plan);
  return (['tablets', 'granular', 'liquid'] as const).map((kind): Alternative => {
    const fast = kind === 'tablets' ? [null] : options.fast.filter(({ form }) => form === kind);
    const possible = kind === 'tablets' ? options.tabletsMayBe : fast.length > 0;
    const allowed = kind === 'tablets' ? choice : without;
    const draft = possible ? sketchAlone(response, { choice: allowed, fast }, sketches) : emptyDraft(without);
    const found = byMedian(draft, allowed, context);
    const doses = plannedDoses(draft, allowed, context);
    const burden = burdenOf(found, doses, context);
    return { kind, feasible: possible && burden.hoursOutside === 0, doses, ...burden, total: cost.of(draft) };
  });
}

/** What a week asks of the household and leaves in the water, by the median. */
export function burdenOf({ draft, choice, median }: ByMedian, doses: readonly PlannedDose[], context: PlanContext) {
  const water = seriesOf(median);
  const { swimLimit } = context.scenario.pool;
  const hoursOutside = water.freeChlorine.filter((level, hour) => {
    const lowest = lowestLevel(water.cyanuricAcid[hour]!, stabilizedIn(draft, context));
    return level < lowest || (context.swimHour[hour] === true && level > swimLimit);
  }).length;
  return {
    money: moneyOf(draft, choice),
    visits: visitsOf(draft),
    swing: swingOf(water.freeChlorine, context),
    stabilizer: water.cyanuricAcid.at(-1)! - water.cyanuricAcid[0]!,
    hardness: water.calciumHardness.at(-1)! - water.calciumHardness[0]!,
    kilograms: doses.reduce((sum, dose) => sum + kilogramsOf(dose, choice.tablets), 0),
    hoursOutside,
  };
}

/** Mean over the days of the difference between highest and lowest free chlorine [mg/L]. */
function swingOf(freeChlorine: ArrayLike<number>, { hours, scenario }: PlanContext): number {
  const days = new Map<string, { low: number; high: number }>();
  hours.forEach((hour, index) => {
    const day = dayOf(hour, scenario.pool.timeZone);
    const level = freeChlorine[index]!;
    const seen = days.get(day) ?? { low: level, high: level };
    days.set(day, { low: Math.min(seen.low, level), high: Math.max(seen.high, level) });
  });
  const swings = [...days.values()].map(({ low, high }) => high - low);
  return swings.reduce((sum, swing) => sum + swing, 0) / swings.length;
}

/** Density of liquid hypochlorite [kg/L]. */
const LIQUID_DENSITY = 1.2;

/** What a dose weighs [kg]. */
export function kilogramsOf(dose: PlannedDose, tablets: { tabletMass: number } | null): number {
  if (dose.unit === 'tablet') return (dose.amount * (tablets?.tabletMass ?? 0)) / 1000;
  return (dose.amount / 1000) * (dose.unit === 'mL' ? LIQUID_DENSITY : 1);
}
