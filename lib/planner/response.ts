import { contentsPerUnit } from '@/lib/chemistry';
import { CYANURIC_ACID_MILLIGRAMS_PER_MOLE, HARDNESS_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { type Course, integrateWeek } from '@/lib/projection/integrate';
import type { Member } from '@/lib/projection/ensemble';
import { lowestLevel } from '@/lib/standards/limits';
import type { PlanContext } from './context';
import {
  type Evaluated,
  hardnessPrice,
  levelsOf,
  moneyOf,
  pHPrice,
  riskOf,
  stabilizedIn,
  stabilizerPrice,
  troubleOf,
} from './cost';
import { type Choice, type Draft, sumOf, tabletDose } from './draft';
import { type FastOption, riseOfFast } from './products';
import { quickLevels } from './quick-levels';
import { remember } from './remember';
import { sideEffectsOf } from './side-effects';

/** What quick levels are off by. */
export type Correction = Float64Array;

/** A quick model of the week: what a draft costs by it. */
export type Response = {
  /** Over all search members; `correction` makes free chlorine exact at the plan from which it was taken. */
  cost: (draft: Draft, correction?: Correction) => number;
  /** Over every second search member: for a first look at many drafts. */
  roughCost: (draft: Draft) => number;
  correctionAt: (evaluated: Evaluated) => Correction;
  /** Free chlorine that one measure adds on each evening [mg/L]. */
  measureRises: (fast: FastOption) => readonly number[];
};

/**
 * The quick model that drafts are screened with: free chlorine by the quick week, side effects added up, the same prices as
 * those of a full projection. What the screening finds is projected in full.
 */
export function responseOf(context: PlanContext, choice: Choice): Response {
  const { scenario, undosed } = context;
  const { pool, preferences } = scenario;
  const { evenings } = choice;
  const measureRises = remember((fast: FastOption) =>
    evenings.map(({ at }) => riseOfFast(fast, fast.measure, at, pool.volume)),
  );
  const probeCount = Math.max(1, Math.round((choice.tablets?.most ?? 0) / 2));
  const members = [{ member: context.median, undosed }, ...context.searchMembers].map((each) => ({
    ...each,
    withTablets: withTablets(context, choice, each.member, probeCount),
  }));
  const levels = quickLevels(context, choice, members, probeCount, measureRises);
  const roughMembers = members.filter((_, index) => index % 2 === 0);
  const roughLevels = quickLevels(context, choice, roughMembers, probeCount, measureRises);

  const effects = sideEffectsOf(context, choice);
  const stabilizer = undosed.hourly.cyanurate.map((cyanurate) => cyanurate * CYANURIC_ACID_MILLIGRAMS_PER_MOLE);
  // Stabilizer is taken as rising evenly to where the tablets bring it.
  const lowestOf = remember(
    (draft: Draft) => {
      const rise = effects.endOf(draft, measureRises).cyanuricAcid - stabilizer.at(-1)!;
      const stabilized = stabilizedIn(draft, context);
      const last = stabilizer.length - 1;
      return stabilizer.map((value, hour) => lowestLevel(value + (rise * hour) / last, stabilized));
    },
    ({ tablets }) => tablets.join(),
  );
  const calciumWithout = undosed.end.calcium * HARDNESS_MILLIGRAMS_PER_MOLE;

  const costAt = (draft: Draft, levelsThen: Float64Array): number => {
    const risk = riskOf(levelsThen, lowestOf(draft), context);
    const end = effects.endOf(draft, measureRises);
    return (
      preferences.money * moneyOf(draft, choice) +
      preferences.evenings * troubleOf(draft) +
      preferences.steadiness * (risk.shortfall + risk.excess) +
      stabilizerPrice(end.cyanuricAcid, context) +
      hardnessPrice(calciumWithout + calciumOf(draft, evenings, pool.volume), context) +
      pHPrice(context.start.water, end.pH, end.totalAlkalinity, context)
    );
  };
  return {
    measureRises,
    roughCost: (draft) => costAt(draft, roughLevels(draft)),
    cost: (draft, correction) => {
      const levelsThen = levels(draft);
      if (correction) for (let at = 0; at < levelsThen.length; at++) levelsThen[at]! += correction[at]!;
      return costAt(draft, levelsThen);
    },
    correctionAt: ({ draft, median, courses }) => {
      const levelsThen = levels(draft);
      return levelsOf([median, ...courses]).map((level, at) => level - levelsThen[at]!);
    },
  };
}

/** A member's week with so many tablets, loaded on the first evening. */
function withTablets(
  { forcing, given }: PlanContext,
  { evenings, tablets }: Choice,
  { start, setting }: Member,
  count: number,
): Course | null {
  const at = evenings[0]?.at;
  if (!tablets || tablets.most === 0 || at === undefined) return null;
  return integrateWeek(forcing, start, [...given, tabletDose(tablets, count, at)], setting);
}

/** Hardness that the granules of a draft add [mg/L as CaCO3]. */
function calciumOf({ fast, measures }: Draft, evenings: Choice['evenings'], volume: number): number {
  if (!fast || fast.form !== 'granular') return 0;
  const amount = sumOf(measures) * fast.measure;
  if (amount === 0) return 0;
  const contents = contentsPerUnit(fast.dose(amount, evenings[0]!.at));
  return (contents.calcium * amount * HARDNESS_MILLIGRAMS_PER_MOLE) / (volume * 1000);
}
