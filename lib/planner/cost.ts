import { type Course, integrateWeek } from '@/lib/projection/integrate';
import type { Member } from '@/lib/projection/ensemble';
import { seriesOf } from '@/lib/projection';
import type { Cost } from '@/lib/schemas/plan';
import { limits, lowestLevel } from '@/lib/standards/limits';
import { surfaceRanges } from '@/lib/standards/surface-ranges';
import type { PlanContext } from './context';
import { type Choice, type Draft, visitsOf, weekDosesOf } from './draft';
import { weights } from './weights';

export type Evaluated = { draft: Draft; choice: Choice; median: Course; courses: Course[]; cost: Cost };

/** Projects a draft in full over some members and prices it. */
export function evaluate(draft: Draft, choice: Choice, context: PlanContext, members: readonly Member[]): Evaluated {
  const doses = weekDosesOf(draft, choice, context);
  const run = ({ start, setting }: Member) => integrateWeek(context.forcing, start, doses, setting);
  const median = run(context.median);
  const courses = members.map(run);
  return { draft, choice, median, courses, cost: costOf(draft, choice, median, courses, context) };
}

/**
 * The whole cost of a week, in the currency of the prices: products, evenings, expected shortfall under the lowest level,
 * expected excess over the swim limit, and undoing what drifted; see {@link weights}.
 */
function costOf(draft: Draft, choice: Choice, median: Course, courses: readonly Course[], context: PlanContext): Cost {
  const { preferences } = context.scenario;
  const water = seriesOf(median);
  const stabilized = stabilizedIn(draft, context);
  const lowest = Float64Array.from(water.cyanuricAcid, (stabilizer) => lowestLevel(stabilizer, stabilized));
  const chlorineOf = (course: Course) => Float64Array.from(course.ledgers, ({ freeChlorine }) => freeChlorine);
  const risk = riskOf(courses.map(chlorineOf), chlorineOf(median), lowest, context);
  const first = context.start.water;
  const cost = {
    money: preferences.money * moneyOf(draft, choice),
    visits: preferences.evenings * weights.visit * visitsOf(draft),
    shortfall: preferences.steadiness * risk.shortfall,
    excess: preferences.steadiness * risk.excess,
    stabilizer: stabilizerPrice(water.cyanuricAcid.at(-1)!, context),
    hardness: hardnessPrice(water.calciumHardness.at(-1)!, context),
    pH: pHPrice(first, water.pH, water.totalAlkalinity.at(-1)!, context),
  };
  return { ...cost, total: Object.values(cost).reduce((sum, each) => sum + each, 0) };
}

export function stabilizedIn(draft: Draft, context: PlanContext): boolean {
  return context.stabilizedProductUsed || draft.tablets > 0;
}

export function moneyOf(draft: Draft, { tablets, fast }: Choice): number {
  const measures = draft.measures.reduce((sum, each) => sum + each, 0);
  return draft.tablets * (tablets?.price ?? 0) + measures * (fast?.measurePrice ?? 0);
}

/**
 * Weighted shortfall and excess of rows of free chlorine, one for each member, and of the median.
 *
 * @param lowest lowest level at each hour [mg/L]
 */
export function riskOf(
  rows: readonly Float64Array[],
  median: Float64Array,
  lowest: Float64Array,
  { swimCeiling, swimHour }: Pick<PlanContext, 'swimCeiling' | 'swimHour'>,
): { shortfall: number; excess: number } {
  const risk = { shortfall: 0, excess: 0 };
  for (const row of rows)
    addRisk(risk, row, lowest, swimCeiling, weights.shortfall / rows.length, weights.excess / rows.length);
  addRisk(risk, median, lowest, swimCeiling, weights.medianShortfall, weights.medianExcess);
  for (let hour = 0; hour < median.length; hour++) {
    if (!swimHour[hour]) continue;
    if (median[hour]! < lowest[hour]!) risk.shortfall += weights.closedSwimHour;
    else if (median[hour]! > swimCeiling[hour]!) risk.excess += weights.closedSwimHour;
  }
  return risk;
}

function addRisk(
  risk: { shortfall: number; excess: number },
  row: Float64Array,
  lowest: Float64Array,
  ceiling: Float64Array,
  under: number,
  over: number,
): void {
  const maximum = limits.freeChlorineMaximum.value;
  let shortfall = 0;
  let excess = 0;
  for (let hour = 1; hour < row.length; hour++) {
    const value = row[hour]!;
    if (value < lowest[hour]!) shortfall += lowest[hour]! - value;
    else if (value > ceiling[hour]!) excess += value - ceiling[hour]!;
    if (value > maximum) excess += weights.overMaximum * (value - maximum);
  }
  risk.shortfall += under * shortfall;
  risk.excess += over * excess;
}

/** How much of a rise leads away from a band: nothing up to two thirds of it (30 to 50 of 30 to 60), all from its end on. */
function awayFrom([low, high]: readonly [number, number], at: number): number {
  const aim = low + (2 / 3) * (high - low);
  return Math.min(1, Math.max(0, (at - aim) / (high - aim)));
}

/** Undoing the plan's own rise of stabilizer: the replacement water that takes it out again, as far as it leads away from the band. */
export function stabilizerPrice(
  to: number,
  { scenario, undosedEnd }: Pick<PlanContext, 'scenario' | 'undosedEnd'>,
): number {
  const { pool, driftPrices } = scenario;
  const rise = Math.max(0, to - undosedEnd.cyanuricAcid);
  const each = driftPrices.stabilizer ?? (weights.water * pool.volume) / Math.max(20, to);
  return rise * each * awayFrom(pool.stabilizerBand, to);
}

/** The same for hardness; fill water that is hard itself takes little out, so each step weighs more. */
export function hardnessPrice(
  to: number,
  { scenario, undosedEnd }: Pick<PlanContext, 'scenario' | 'undosedEnd'>,
): number {
  const { pool, driftPrices } = scenario;
  const rise = Math.max(0, to - undosedEnd.calciumHardness);
  const fill = pool.fillWater.calciumHardness;
  const each = driftPrices.hardness ?? (weights.water * pool.volume) / Math.max(20, to - fill);
  return rise * each * awayFrom(surfaceRanges[pool.surface].calciumHardness, Math.max(to, fill));
}

/** Bringing pH and alkalinity back, as far as they were led away from where they are kept; and hours out of range. */
export function pHPrice(
  first: { pH: number; totalAlkalinity: number },
  pH: ArrayLike<number>,
  endAlkalinity: number,
  { scenario, swimHour }: Pick<PlanContext, 'scenario' | 'swimHour'>,
): number {
  const { pool, driftPrices } = scenario;
  const fromAim = (value: number) => Math.max(limits.pHAimLow.value - value, value - limits.pHAimHigh.value, 0);
  const away = Math.max(0, fromAim(pH[pH.length - 1]!) - fromAim(first.pH));
  const each = driftPrices.pH ?? weights.pHPerCubicMetre * pool.volume;
  const alkalinityLost = Math.max(0, Math.min(first.totalAlkalinity, 80) - endAlkalinity);
  let outside = 0;
  for (let hour = 0; hour < pH.length; hour++) {
    const by = Math.max(limits.pHRangeLow.value - pH[hour]!, pH[hour]! - limits.pHRangeHigh.value, 0);
    outside += (by / 0.1) * weights.pHOutside;
    if (by > 0 && swimHour[hour]) outside += weights.closedSwimHour;
  }
  return (away / 0.1) * each + (alkalinityLost / 10) * weights.alkalinityPerCubicMetre * pool.volume + outside;
}
