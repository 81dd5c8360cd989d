import { contentsPerUnit } from '@/lib/chemistry';
import { CYANURIC_ACID_MILLIGRAMS_PER_MOLE, HARDNESS_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { quantile } from '@/lib/projection/quantiles';
import { limits, lowestLevel } from '@/lib/standards/limits';
import type { PlanContext } from './context';
import {
  type Evaluated,
  hardnessPrice,
  levelsOf,
  moneyOf,
  pHDriftPrice,
  pHOutsidePrice,
  stabilizedIn,
  stabilizerPrice,
  troubleOf,
} from './cost';
import { type Choice, type Draft, sumOf } from './draft';
import { type FastOption, riseOfFast } from './products';
import { type Correction, QuickRisk } from './quick-risk';
import { remember } from './remember';
import { SideEffects } from './side-effects';

/** What a draft costs by a quick model; infinite as soon as that is known to be more than `most`. */
export type QuickCost = {
  of: (draft: Draft, most?: number) => number;
  /** Makes the draft asked about last the one from which the next ones differ little: those are then reckoned sooner. */
  settle: () => void;
};

/** A quick model of the week. */
export type Response = {
  /** Over a few of the ensemble, the median in place of its middle: for a first look at many drafts. */
  roughCost: QuickCost;
  /** With the middle of the ensemble as far from the median as it is with a draft: over a few, and over half of them. */
  costsNear: (draft: Draft) => { rough: QuickCost; whole: QuickCost };
  /** The same, made to agree with a plan that was projected in full over the whole ensemble. */
  costAround: (evaluated: Evaluated) => QuickCost;
  /** Share of the swim hours in which the middle of the ensemble keeps the limits, by half of it. */
  openShareOf: (draft: Draft) => number;
  /** Free chlorine that one measure adds on each evening [mg/L]. */
  measureRises: (fast: FastOption) => readonly number[];
};

/**
 * The quick model that drafts are screened with: free chlorine by the quick week, side effects added up, the same prices as
 * those of a full projection. What the screening finds is projected in full.
 */
export function responseOf(context: PlanContext, choice: Choice): Response {
  const { scenario, undosed } = context;
  const { pool } = scenario;
  const { evenings } = choice;
  const measureRises = remember((fast: FastOption) =>
    evenings.map(({ at }) => riseOfFast(fast, fast.measure, at, pool.volume)),
  );
  const effects = new SideEffects(context, choice, measureRises);
  const stabilizer = undosed.hourly.cyanurate.map((cyanurate) => cyanurate * CYANURIC_ACID_MILLIGRAMS_PER_MOLE);
  const lowestOf = (draft: Draft) => {
    const moves = effects.stabilizerOf(draft);
    const stabilized = stabilizedIn(draft, context);
    return stabilizer.map((value, hour) => lowestLevel(value + moves[hour]!, stabilized));
  };
  const measureHardness = remember((fast: FastOption) => hardnessOf(fast, evenings[0]?.at ?? 0, pool.volume));
  const hardnessWithout = undosed.end.calcium * HARDNESS_MILLIGRAMS_PER_MOLE;

  const prices = { context, choice, effects, measureHardness, hardnessWithout };
  const costBy = (risk: QuickRisk, correction?: Correction, offset?: number) =>
    new CostByRisk(prices, risk, correction, offset);
  const riskOver = (members: PlanContext['quickMembers']) =>
    new QuickRisk(context, choice, [{ member: context.median, undosed }, ...members], {
      effects,
      measureRises,
      lowestOf,
    });
  const all = riskOver(context.quickMembers);
  const few = riskOver(context.roughMembers);
  const columns = 1 + context.quickMembers.length;
  return {
    measureRises,
    roughCost: costBy(few),
    openShareOf: (draft) => {
      const levels = all.levelsOf(draft);
      const gaps = middleOverMedian(levels, columns);
      const lowest = lowestOf(draft);
      const pH = pHOf(draft, prices);
      const open = context.swimHour.map((swims, hour) => {
        const level = levels[hour * columns]! + gaps[hour]!;
        const chlorineFits = level >= lowest[hour]! && level <= context.swimCeiling[hour]!;
        return swims && chlorineFits && pH[hour]! >= limits.pHRangeLow.value && pH[hour]! <= limits.pHRangeHigh.value;
      });
      return count(open) / Math.max(1, count(context.swimHour));
    },
    costsNear: (draft) => {
      const gaps = middleOverMedian(all.levelsOf(draft), columns);
      const beside = (members: number) => {
        const correction = new Float64Array(gaps.length * (1 + members));
        gaps.forEach((gap, hour) => (correction[hour * (1 + members)] = gap));
        return correction;
      };
      return {
        rough: costBy(few, beside(context.roughMembers.length)),
        whole: costBy(all, beside(context.quickMembers.length)),
      };
    },
    costAround: ({ draft, middle, courses, cost }) => {
      const quick = all.levelsOf(draft);
      const members = courses.slice(0, context.quickMembers.length).map(({ hourly }) => hourly.freeChlorine);
      const exact = levelsOf(middle, members);
      const correction = exact.map((level, at) => level - quick[at]!);
      // What is left is what the other half of the ensemble, and side effects that do not quite add up, make of it.
      return costBy(all, correction, cost.total - costBy(all, correction).of(draft));
    },
  };
}

/** What the prices of drafts hang on. */
type Prices = {
  context: PlanContext;
  choice: Choice;
  effects: SideEffects;
  measureHardness: (fast: FastOption) => number;
  hardnessWithout: number;
};

/** Prices and risk of a draft. A class, since V8 compiles a method once and a closure anew in every plan. */
class CostByRisk implements QuickCost {
  constructor(
    private readonly prices: Prices,
    private readonly risk: QuickRisk,
    private readonly correction?: Correction,
    private readonly offset = 0,
  ) {}

  of(draft: Draft, most = Infinity): number {
    const { steadiness } = this.prices.context.scenario.preferences;
    const prices = pricesOf(draft, most - this.offset, this.prices) + this.offset;
    if (prices > most) return Infinity;
    if (steadiness === 0) return prices;
    return prices + steadiness * this.risk.riskOf(draft, (most - prices) / steadiness, this.correction);
  }

  settle(): void {
    this.risk.settle();
  }
}

/** All that a draft costs beside risk, or all but the hours in which pH is out of range when that is past `most`. */
function pricesOf(draft: Draft, most: number, parts: Prices): number {
  const { context, choice, effects, measureHardness, hardnessWithout } = parts;
  const { preferences } = context.scenario;
  const end = effects.endOf(draft);
  const prices =
    preferences.money * moneyOf(draft, choice) +
    preferences.evenings * troubleOf(draft) +
    stabilizerPrice(end.cyanuricAcid, context) +
    hardnessPrice(hardnessWithout + (draft.fast ? sumOf(draft.measures) * measureHardness(draft.fast) : 0), context) +
    pHDriftPrice(context.start.water, end.pH, end.totalAlkalinity, context);
  const pHStays = end.low >= limits.pHRangeLow.value && end.high <= limits.pHRangeHigh.value;
  return pHStays || prices > most ? prices : prices + pHOutsidePrice(pHOf(draft, parts), context);
}

/** The median's pH with a draft, by hour. */
function pHOf(draft: Draft, { context: { undosed }, effects }: Prices): Float64Array {
  const moves = effects.pHMovedBy(draft, 0);
  return undosed.pH.map((value, hour) => value + moves[hour]!);
}

function count(hours: readonly boolean[]): number {
  return hours.filter(Boolean).length;
}

/** How far the middle of the members is from the median, which comes first in each row, by hour [mg/L]. */
function middleOverMedian(levels: Float64Array, columns: number): Float64Array {
  const sorted = new Float64Array(columns - 1);
  return Float64Array.from({ length: levels.length / columns }, (_, hour) => {
    const first = hour * columns;
    sorted.set(levels.subarray(first + 1, first + columns));
    return quantile(sorted.sort(), 0.5) - levels[first]!;
  });
}

/** Hardness that one measure of granules adds [mg/L as CaCO3]. */
function hardnessOf(fast: FastOption, at: number, volume: number): number {
  if (fast.form !== 'granular') return 0;
  const { calcium } = contentsPerUnit(fast.dose(fast.measure, at));
  return (calcium * fast.measure * HARDNESS_MILLIGRAMS_PER_MOLE) / (volume * 1000);
}
