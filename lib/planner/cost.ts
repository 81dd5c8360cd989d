import {
  ALKALINITY_MILLIGRAMS_PER_EQUIVALENT,
  CYANURIC_ACID_MILLIGRAMS_PER_MOLE,
  HARDNESS_MILLIGRAMS_PER_MOLE,
} from '@/lib/chemistry/molar-masses';
import { type Course, integrateWeek } from '@/lib/projection/integrate';
import type { Member } from '@/lib/projection/ensemble';
import { seriesOf } from '@/lib/projection';
import { bandOf } from '@/lib/projection/quantiles';
import type { Cost } from '@/lib/schemas/plan';
import { limits, lowestLevel } from '@/lib/standards/limits';
import { surfaceRanges } from '@/lib/standards/surface-ranges';
import type { PlanContext } from './context';
import { type Choice, type Draft, measuresToBuy, sumOf, visitsOf, weekDosesOf } from './draft';
import { weights } from './weights';

/** A draft projected with every parameter at its median. */
export type ByMedian = { draft: Draft; choice: Choice; median: Course };

/** A draft projected over the ensemble, too, and priced. */
export type Evaluated = ByMedian & {
  courses: Course[];
  /** Free chlorine that half of the ensemble stays under, hour by hour [mg/L]: what limits are held against. */
  middle: Float64Array;
  cost: Cost;
};

/** Projects a draft in full over the ensemble and prices it. */
export function evaluate(draft: Draft, choice: Choice, context: PlanContext): Evaluated {
  const { median, courses } = coursesOf(draft, choice, context, context.members);
  const middle = Float64Array.from(bandOf(courses.map(({ hourly }) => hourly.freeChlorine)).p50);
  return { draft, choice, median, courses, middle, cost: costOf(draft, choice, median, courses, middle, context) };
}

/**
 * How much more a draft costs than a plan that was projected over the whole ensemble, seen over the first few of its
 * members; the middle of the ensemble is taken to lie as far from the median's course as it does with the plan.
 */
export function differenceOnTrial(draft: Draft, plan: Evaluated, context: PlanContext, members: number): number {
  const { choice } = plan;
  const { median, courses } = coursesOf(draft, choice, context, context.members.slice(0, members));
  const middle = median.hourly.freeChlorine.map((level, hour) =>
    Math.max(0, level + plan.middle[hour]! - plan.median.hourly.freeChlorine[hour]!),
  );
  const few = plan.courses.slice(0, members);
  return (
    costOf(draft, choice, median, courses, middle, context).total -
    costOf(plan.draft, choice, plan.median, few, plan.middle, context).total
  );
}

/** Projects a draft with every parameter at its median. */
export function byMedian(draft: Draft, choice: Choice, context: PlanContext): ByMedian {
  return { draft, choice, median: coursesOf(draft, choice, context, []).median };
}

/** The median's course with a draft, and those of members. */
export function coursesOf(draft: Draft, choice: Choice, context: PlanContext, members: readonly Member[]) {
  const doses = weekDosesOf(draft, choice, context);
  const run = ({ start, setting }: Member) => integrateWeek(context.forcing, start, doses, setting);
  return { median: run(context.median), courses: members.map(run) };
}

/**
 * The whole cost of a week, in the currency of the prices: products, evenings, expected shortfall under the lowest level,
 * expected excess over the swim limit, and undoing what drifted; see {@link weights}.
 */
export function costOf(
  draft: Draft,
  choice: Choice,
  median: Course,
  courses: readonly Course[],
  middle: Float64Array,
  context: PlanContext,
): Cost {
  const { preferences } = context.scenario;
  const water = seriesOf(median);
  const lowest = lowestLevelsOf({ draft, median }, context);
  const members = courses.map(({ hourly }) => hourly.freeChlorine);
  const risk = riskOf(levelsOf(middle, members), lowest, context);
  const cost = {
    money: preferences.money * moneyOf(draft, choice),
    visits: preferences.evenings * troubleOf(draft),
    shortfall: preferences.steadiness * risk.shortfall,
    excess: preferences.steadiness * risk.excess,
    stabilizer: stabilizerPrice(water.cyanuricAcid.at(-1)!, context),
    hardness: hardnessPrice(water.calciumHardness.at(-1)!, context),
    pH:
      pHDriftPrice(context.start.water, median.endPH, water.totalAlkalinity.at(-1)!, context) +
      pHOutsidePrice(water.pH, context),
  };
  return { ...cost, total: Object.values(cost).reduce((sum, each) => sum + each, 0) };
}

/** Lowest level at each hour with the stabilizer of the median's course [mg/L]. */
export function lowestLevelsOf({ draft, median }: Pick<ByMedian, 'draft' | 'median'>, context: PlanContext) {
  const stabilized = stabilizedIn(draft, context);
  return Float64Array.from(seriesOf(median).cyanuricAcid, (stabilizer) => lowestLevel(stabilizer, stabilized));
}

export function stabilizedIn(draft: Draft, context: PlanContext): boolean {
  return context.stabilizedProductUsed || sumOf(draft.tablets) > 0;
}

export function moneyOf({ tablets, fast, measures }: Draft, choice: Choice): number {
  return sumOf(tablets) * (choice.tablets?.price ?? 0) + sumOf(measures) * (fast?.measurePrice ?? 0);
}

/** The price of going to the pool, and to the shop. */
export function troubleOf(draft: Draft): number {
  return weights.visit * visitsOf(draft) + (measuresToBuy(draft) > 0 ? weights.errand : 0);
}

/** Free chlorine [mg/L], hour by hour, the middle and the members side by side: [hour * (members + 1) + column]. */
export function levelsOf(middle: Float64Array, members: readonly Float64Array[]): Float64Array {
  const columns = [middle, ...members];
  const levels = new Float64Array(middle.length * columns.length);
  columns.forEach((column, index) => {
    for (let hour = 0; hour < column.length; hour++) levels[hour * columns.length + index] = column[hour]!;
  });
  return levels;
}

type Risk = { shortfall: number; excess: number };

/**
 * Weighted shortfall and excess of the middle of the ensemble, which comes first, and of its members after it, laid out as
 * by {@link levelsOf}: expected over the members, and again for the middle, which limits are held against.
 *
 * @param lowest lowest level at each hour [mg/L]
 */
export function riskOf(
  levels: Float64Array,
  lowest: Float64Array,
  { swimCeiling, swimHour }: Pick<PlanContext, 'swimCeiling' | 'swimHour'>,
): Risk {
  const columns = levels.length / lowest.length;
  const each = 1 / Math.max(1, columns - 1);
  const maximum = limits.freeChlorineMaximum.value;
  const risk = { shortfall: 0, excess: 0 };
  for (let hour = 1; hour < lowest.length; hour++) {
    const [least, most] = [lowest[hour]!, swimCeiling[hour]!];
    let under = 0;
    let over = 0;
    for (let at = hour * columns + 1, end = (hour + 1) * columns; at < end; at++) {
      const level = levels[at]!;
      if (level < least) under += least - level;
      else if (level > most) over += level - most;
      if (level > maximum) over += weights.overMaximum * (level - maximum);
    }
    risk.shortfall += weights.shortfall * each * under;
    risk.excess += weights.excess * each * over;

    const middle = levels[hour * columns]!;
    const closed = swimHour[hour] ? weights.closedSwimHour : 0;
    if (middle < least) risk.shortfall += weights.medianShortfall * (least - middle) + closed;
    else if (middle > most) risk.excess += weights.medianExcess * (middle - most) + closed;
    if (middle > maximum) risk.excess += weights.medianExcess * weights.overMaximum * (middle - maximum);
  }
  return risk;
}

/** How much of a rise leads away from a band: nothing up to two thirds of it (30 to 50 of 30 to 60), all from its end on. */
function awayFrom([low, high]: readonly [number, number], at: number): number {
  const aim = low + (2 / 3) * (high - low);
  return Math.min(1, Math.max(0, (at - aim) / (high - aim)));
}

/** Undoing the plan's own rise of stabilizer: the replacement water that takes it out again, as far as it leads away from the band. */
export function stabilizerPrice(to: number, { scenario, undosed }: Pick<PlanContext, 'scenario' | 'undosed'>): number {
  const { pool, driftPrices } = scenario;
  const rise = Math.max(0, to - undosed.end.cyanurate * CYANURIC_ACID_MILLIGRAMS_PER_MOLE);
  const each = driftPrices.stabilizer ?? (weights.water * pool.volume) / Math.max(20, to);
  return rise * each * awayFrom(pool.stabilizerBand, to);
}

/** The same for hardness; fill water that is hard itself takes little out, so each step weighs more. */
export function hardnessPrice(to: number, { scenario, undosed }: Pick<PlanContext, 'scenario' | 'undosed'>): number {
  const { pool, driftPrices } = scenario;
  const rise = Math.max(0, to - undosed.end.calcium * HARDNESS_MILLIGRAMS_PER_MOLE);
  const fill = pool.fillWater.calciumHardness;
  const each = driftPrices.hardness ?? (weights.water * pool.volume) / Math.max(20, to - fill);
  return rise * each * awayFrom(surfaceRanges[pool.surface].calciumHardness, Math.max(to, fill));
}

/** The hours in which pH is out of its range. */
export function pHOutsidePrice(pH: ArrayLike<number>, { swimHour }: Pick<PlanContext, 'swimHour'>): number {
  let outside = 0;
  for (let hour = 0; hour < pH.length; hour++) {
    const by = Math.max(limits.pHRangeLow.value - pH[hour]!, pH[hour]! - limits.pHRangeHigh.value, 0);
    outside += (by / 0.1) * weights.pHOutside;
    if (by > 0 && swimHour[hour]) outside += weights.closedSwimHour;
  }
  return outside;
}

/** From here on water holds its pH [mg/L as CaCO3]: the low end of what codes call ideal. */
export const ENOUGH_ALKALINITY = 80;

/**
 * The price of bringing pH and alkalinity back at the end of the week, as far as the plan itself moved them. In water that
 * has too little alkalinity to begin with each mg/L weighs more: a dose, a visit and a test bring it back.
 */
export function pHDriftPrice(
  first: { pH: number; totalAlkalinity: number },
  endPH: number,
  endAlkalinity: number,
  { scenario, undosed }: Pick<PlanContext, 'scenario' | 'undosed'>,
): number {
  const { pool, driftPrices } = scenario;
  const fromAim = (value: number) => Math.max(limits.pHAimLow.value - value, value - limits.pHAimHigh.value, 0);
  const away = Math.max(0, fromAim(endPH) - fromAim(first.pH));
  const each = driftPrices.pH ?? weights.pHPerCubicMetre * pool.volume;
  const undosedAlkalinity = undosed.end.alkalinity * ALKALINITY_MILLIGRAMS_PER_EQUIVALENT;
  const lost = Math.max(0, Math.min(undosedAlkalinity, ENOUGH_ALKALINITY) - endAlkalinity);
  const weak = Math.min(1, Math.max(0, ENOUGH_ALKALINITY - first.totalAlkalinity) / 20);
  const alkalinityPrice = weights.alkalinityPerCubicMetre * pool.volume * (1 + weights.weakWater * weak);
  return (away / 0.1) * each + (lost / 10) * alkalinityPrice;
}
