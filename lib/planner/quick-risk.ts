import { weekDose } from '@/lib/projection/events';
import { HOURS_IN_PLAN } from '@/lib/projection/forcing';
import { pumpShares } from '@/lib/projection/pump';
import type { PlanContext, Undosed } from './context';
import { type Choice, type Draft, sumOf } from './draft';
import type { FastOption } from './products';
import { reckonOn, type RiskBounds, startOf } from './quick-course';
import { hourOf, type QuickWeek, quickWeek } from './quick-week';
import { remember } from './remember';
import type { SideEffects } from './side-effects';
import { weights } from './weights';

/** What quick levels are off by, laid out like them. */
export type Correction = Float64Array;

type Answers = {
  effects: SideEffects;
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
 *
 * A class, since V8 compiles a method once and a closure anew in every plan.
 */
export class QuickRisk {
  private readonly quick: QuickWeek;
  private readonly members: number;
  private readonly hours: readonly number[];
  private readonly loadingOf: (draft: Draft) => Loading;
  private readonly rises = new Float64Array(HOURS_IN_PLAN + 1);
  private settled: Reckoned;
  private asked: Reckoned;
  private from = 0;
  private loading: Loading | null = null;
  private loaded: readonly number[] | null = null;

  constructor(
    context: PlanContext,
    choice: Choice,
    members: readonly Undosed[],
    private readonly answers: Answers,
  ) {
    this.quick = quickWeek(context, members);
    this.members = members.length;
    this.hours = choice.evenings.map(({ at }) => hourOf(at, context.forcing));
    this.loadingOf = loadings(context, choice, this.quick, this.hours, answers);
    this.settled = newReckoned(members.length);
    this.asked = newReckoned(members.length);
  }

  /**
   * Weighted shortfall and excess of a draft; infinite as soon as they pass `most`, which saves the rest of the week. A
   * draft that differs from the one settled on only from some evening on is reckoned from there on.
   */
  riskOf(draft: Draft, most: number, correction?: Correction): number {
    if (this.loaded !== draft.tablets) [this.loading, this.loaded] = [this.loadingOf(draft), draft.tablets];
    const { bounds, sheltered, sourceOf } = this.loading!;
    const { levels, risks } = this.asked;
    const { frame } = this.quick;
    this.putRises(draft);
    this.asked.draft = null;
    this.asked.correction = correction;
    const from = this.differsFrom(draft, correction);
    this.from = from;
    const first = from * this.members;
    const week = {
      rises: this.rises,
      source: sourceOf(draft.measures),
      pH: this.answers.effects.pHMovedBy(draft, from),
      sheltered,
    };
    if (from === 0) startOf(frame, this.rises[0]!, levels);
    else levels.set(this.settled.levels.subarray(first, first + this.members), first);
    risks[from] = from === 0 ? 0 : this.settled.risks[from]!;
    const risk = reckonOn(frame, week, bounds, correction ?? null, from, levels, risks, most);
    if (risk > most) return Infinity;
    this.asked.draft = draft;
    return risk;
  }

  /** Makes the draft that was asked about last, not past its `most`, the one that is settled on. */
  settle(): void {
    const { asked, settled, from } = this;
    if (!asked.draft) return;
    asked.levels.set(settled.levels.subarray(0, from * this.members));
    asked.risks.set(settled.risks.subarray(0, from));
    this.settled = asked;
    this.asked = settled;
    // Nothing has been asked about since.
    this.asked.draft = null;
  }

  /** Free chlorine of a draft [mg/L]: hour by hour, the members side by side. */
  levelsOf(draft: Draft): Float64Array {
    const { bounds, sheltered, sourceOf } = this.loadingOf(draft);
    const { levels, risks } = newReckoned(this.members);
    this.putRises(draft);
    startOf(this.quick.frame, this.rises[0]!, levels);
    const pH = this.answers.effects.pHMovedBy(draft, 0);
    const week = { rises: this.rises, source: sourceOf(draft.measures), pH, sheltered };
    reckonOn(this.quick.frame, week, bounds, null, 0, levels, risks, Infinity);
    return levels;
  }

  private putRises({ fast, measures }: Draft): void {
    const { rises, hours } = this;
    rises.fill(0);
    if (!fast) return;
    const each = this.answers.measureRises(fast);
    for (let evening = 0; evening < hours.length; evening++)
      rises[hours[evening]!]! += measures[evening]! * each[evening]!;
  }

  /** From which hour on a draft may differ from the one settled on. */
  private differsFrom({ tablets, fast, measures }: Draft, correction?: Correction): number {
    const { draft: before } = this.settled;
    if (!before || this.settled.correction !== correction) return 0;
    if (before.fast !== fast || !same(before.tablets, tablets)) return 0;
    let evening = 0;
    while (evening < measures.length && measures[evening] === before.measures[evening]) evening++;
    // A dose between two hours already moves the pump in the hour before the one at which it shows.
    return evening === measures.length ? HOURS_IN_PLAN : Math.max(0, this.hours[evening]! - 1);
  }
}

/** What hangs on the tablets of a draft, reckoned once for each loading of them. */
function loadings(
  { forcing, given, scenario, start, swimHour, swimCeiling }: PlanContext,
  { evenings, tablets }: Choice,
  quick: QuickWeek,
  hours: readonly number[],
  { lowestOf, effects }: Answers,
): (draft: Draft) => Loading {
  const pump = pumpShares(forcing, given);
  const pumpedOn = evenings.map(({ at }) => {
    const small = weekDose(at, { substance: 'sodium-hypochlorite', amount: 1 }, scenario.pool.volume);
    return differences(pumpShares(forcing, [...given, small]), pump);
  });
  const inFeeder = start.loads.length > 0 || given.some(({ kind }) => kind === 'tablets');

  const closed = Float64Array.from(swimHour, (swims) => (swims ? weights.closedSwimHour : 0));
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
  return remember(
    (draft: Draft): Loading => {
      const sourceOf = remember((dosed: number) => {
        // What was in the feeder before hangs on the pump; without any, one source does for all.
        const source = sourceWithout(inFeeder ? dosed : 0).slice();
        draft.tablets.forEach((each, evening) => {
          if (each > 0) addTimes(source, releases[evening]!(dosed), each);
        });
        return source;
      });
      // Without tablets nothing hangs on the pump.
      const hangsOnPump = sumOf(draft.tablets) > 0 || inFeeder;
      return {
        sheltered: quick.shelteredBy(effects.stabilizerOf(draft)),
        bounds: { lowest: lowestOf(draft), ceiling: swimCeiling, closed },
        sourceOf: (measures) => sourceOf(hangsOnPump ? dosedOn(measures) : 0),
      };
    },
    ({ tablets: counts }) => counts.join(),
  );
}

function addTimes(sum: Float64Array, each: Float64Array, times: number): void {
  for (let at = 0; at < sum.length; at++) sum[at]! += times * each[at]!;
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
