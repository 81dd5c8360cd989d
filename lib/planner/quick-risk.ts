import { weekDose } from '@/lib/projection/events';
import { HOURS_IN_PLAN } from '@/lib/projection/forcing';
import { pumpShares } from '@/lib/projection/pump';
import type { PlanContext, Undosed } from './context';
import { type Choice, type Draft, sumOf } from './draft';
import type { FastOption } from './products';
import { reckonOn, type RiskBounds, startOf } from './quick-course';
import { hourOf, quickWeek } from './quick-week';
import { remember } from './remember';
import type { SideEffects } from './side-effects';
import { weights } from './weights';

/** What quick levels are off by, laid out like them. */
export type Correction = Float64Array;

export type QuickRisk = {
  /**
   * Weighted shortfall and excess of a draft; infinite as soon as they pass `most`, which saves the rest of the week. A
   * draft that differs from the one settled on only from some evening on is reckoned from there on.
   */
  riskOf: (draft: Draft, most: number, correction?: Correction) => number;
  /** Makes the draft that was asked about last, not past its `most`, the one that is settled on. */
  settle: () => void;
  /** Free chlorine of a draft [mg/L]: hour by hour, the members side by side. */
  levelsOf: (draft: Draft) => Float64Array;
};

type Answers = Pick<SideEffects, 'pHMovedBy' | 'stabilizerOf'> & {
  /** Free chlorine that one measure adds on each evening [mg/L]. */
  measureRises: (fast: FastOption) => readonly number[];
  /** Lowest level at each hour with the tablets of a draft [mg/L]. */
  lowestOf: (draft: Draft) => Float64Array;
};

/** A draft's week by the quick model: levels hour by hour, and the risk up to each hour. */
type Reckoned = {
  draft: Draft | null;
  correction: Correction | undefined;
  levels: Float64Array;
  risks: Float64Array;
};

/**
 * Risk of drafts by the quick week. What hangs on the tablets alone is reckoned once for each loading of them, what they
 * release once for each choice of evenings on which the pump runs longer; amounts then cost one pass through the week.
 */
export function quickRisk(
  context: PlanContext,
  { evenings, tablets }: Choice,
  members: readonly Undosed[],
  { measureRises, lowestOf, pHMovedBy, stabilizerOf }: Answers,
): QuickRisk {
  const { forcing, given, scenario, start } = context;
  const quick = quickWeek(context, members);
  const hours = evenings.map(({ at }) => hourOf(at, forcing));
  const pump = pumpShares(forcing, given);
  const pumpedOn = evenings.map(({ at }) => {
    const small = weekDose(at, { substance: 'sodium-hypochlorite', amount: 1 }, scenario.pool.volume);
    return differences(pumpShares(forcing, [...given, small]), pump);
  });
  const inFeeder = start.loads.length > 0 || given.some(({ kind }) => kind === 'tablets');

  const closed = Float64Array.from(context.swimHour, (swims) => (swims ? weights.closedSwimHour : 0));
  const pumpOn = remember((dosed: number) => {
    const shares = pump.slice();
    pumpedOn.forEach((differs, evening) => {
      if (dosed & (1 << evening)) for (const { hour, by } of differs) shares[hour]! += by;
    });
    return shares;
  });
  const sourceWithout = remember((dosed: number) => quick.sourceOf(pumpOn(dosed)));
  const releases = evenings.map((_, evening) =>
    remember((dosed: number) => {
      const { tabletMass, strength } = tablets!;
      const load = { tabletMass, strength, count: 1, erodedShare: 0 };
      return quick.releaseOf({ load, from: hours[evening]! }, pumpOn(dosed));
    }),
  );
  const loadingOf = remember(
    (draft: Draft): Loading => {
      const count = sumOf(draft.tablets);
      const sourceOf = remember((dosed: number) => {
        // What was in the feeder before hangs on the pump; without any, one source does for all.
        const source = sourceWithout(inFeeder ? dosed : 0).slice();
        draft.tablets.forEach((each, evening) => {
          if (each === 0) return;
          const release = releases[evening]!(dosed);
          for (let at = 0; at < source.length; at++) source[at]! += each * release[at]!;
        });
        return source;
      });
      // Without tablets nothing hangs on the pump.
      const hangsOnPump = count > 0 || inFeeder;
      return {
        sheltered: quick.shelteredBy(stabilizerOf(draft)),
        bounds: { lowest: lowestOf(draft), ceiling: context.swimCeiling, closed },
        sourceOf: (measures) => sourceOf(hangsOnPump ? dosedOn(measures) : 0),
      };
    },
    ({ tablets: counts }) => counts.join(),
  );

  const rises = new Float64Array(HOURS_IN_PLAN + 1);
  const putRises = ({ fast, measures }: Draft) => {
    rises.fill(0);
    if (!fast) return;
    const each = measureRises(fast);
    for (let evening = 0; evening < hours.length; evening++)
      rises[hours[evening]!]! += measures[evening]! * each[evening]!;
  };
  let settled = newReckoned(members.length);
  let asked = newReckoned(members.length);
  let from = 0;
  let loading: Loading | null = null;
  let loaded: readonly number[] | null = null;

  /** From which hour on a draft may differ from the one settled on. */
  const differsFrom = (draft: Draft, correction?: Correction): number => {
    const { draft: before } = settled;
    if (!before || settled.correction !== correction) return 0;
    if (before.fast !== draft.fast || !same(before.tablets, draft.tablets)) return 0;
    const evening = draft.measures.findIndex((count, each) => count !== before.measures[each]);
    // A dose between two hours already moves the pump in the hour before the one at which it shows.
    return evening < 0 ? HOURS_IN_PLAN : Math.max(0, hours[evening]! - 1);
  };

  return {
    riskOf: (draft, most, correction) => {
      if (loaded !== draft.tablets) [loading, loaded] = [loadingOf(draft), draft.tablets];
      const { bounds, sheltered, sourceOf } = loading!;
      const { levels, risks } = asked;
      putRises(draft);
      asked.draft = null;
      asked.correction = correction;
      from = differsFrom(draft, correction);
      const first = from * members.length;
      const week = { rises, source: sourceOf(draft.measures), pH: pHMovedBy(draft, from), sheltered };
      if (from === 0) startOf(quick.frame, rises[0]!, levels);
      else levels.set(settled.levels.subarray(first, first + members.length), first);
      risks[from] = from === 0 ? 0 : settled.risks[from]!;
      const risk = reckonOn(quick.frame, week, bounds, correction ?? null, from, levels, risks, most);
      if (risk > most) return Infinity;
      asked.draft = draft;
      return risk;
    },
    settle: () => {
      if (!asked.draft) return;
      asked.levels.set(settled.levels.subarray(0, from * members.length));
      asked.risks.set(settled.risks.subarray(0, from));
      [settled, asked] = [asked, settled];
    },
    levelsOf: (draft) => {
      const { bounds, sheltered, sourceOf } = loadingOf(draft);
      const { levels, risks } = newReckoned(members.length);
      putRises(draft);
      startOf(quick.frame, rises[0]!, levels);
      reckonOn(
        quick.frame,
        { rises, source: sourceOf(draft.measures), pH: pHMovedBy(draft, 0), sheltered },
        bounds,
        null,
        0,
        levels,
        risks,
        Infinity,
      );
      return levels;
    },
  };
}

/** What hangs on the tablets of a draft. */
type Loading = {
  bounds: RiskBounds;
  sheltered: Float64Array;
  sourceOf: (measures: readonly number[]) => Float64Array;
};

function newReckoned(members: number): Reckoned {
  return {
    draft: null,
    correction: undefined,
    levels: new Float64Array((HOURS_IN_PLAN + 1) * members),
    risks: new Float64Array(HOURS_IN_PLAN + 1),
  };
}

/** The evenings with a dose, as the digits of a binary number. */
function dosedOn(measures: readonly number[]): number {
  let dosed = 0;
  for (let evening = 0; evening < measures.length; evening++) if (measures[evening]! > 0) dosed |= 1 << evening;
  return dosed;
}

function same(counts: readonly number[], others: readonly number[]): boolean {
  if (counts === others) return true;
  for (let evening = 0; evening < counts.length; evening++) if (counts[evening] !== others[evening]) return false;
  return true;
}

/** Where two series differ, and by how much. */
function differences(series: Float64Array, from: Float64Array): { hour: number; by: number }[] {
  return Array.from(series, (value, hour) => ({ hour, by: value - from[hour]! })).filter(({ by }) => by !== 0);
}
