import { contentsPerUnit } from '@/lib/chemistry';
import { HARDNESS_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { seriesOf } from '@/lib/projection';
import type { Member } from '@/lib/projection/ensemble';
import { riseOf, type WeekDose, weekDose } from '@/lib/projection/events';
import { integrateWeek } from '@/lib/projection/integrate';
import { lowestLevel } from '@/lib/standards/limits';
import type { PlanContext } from './context';
import { hardnessPrice, moneyOf, pHPrice, riskOf, stabilizedIn, stabilizerPrice } from './cost';
import { type Choice, type Draft, visitsOf } from './draft';
import { type FastOption, riseOfFast, type TabletOption } from './products';
import { weights } from './weights';

/** Members that screening looks at; finalists are projected in full. */
const SCREENING_MEMBERS = 6;
const TABLET_EVENINGS = 2;
const PROBE_RISE = 2;

/** What a linear model of the week says a draft costs, and on how many evenings tablets may be loaded. */
export type Response = {
  cost: (draft: Draft, choice: Choice) => number;
  tabletEvenings: number;
  /** Free chlorine that one measure adds on each evening [mg/L]. */
  measureRises: (fast: FastOption) => readonly number[];
};

type Series = ReturnType<typeof seriesOf>;
/** Change for one unit: each row of free chlorine, the median's pH, its other side quantities at the end of the week. */
type Answer = { rows: Float64Array[]; pH: Float64Array; totalAlkalinity: number; cyanuricAcid: number };

/**
 * A linear model of the week for screening: base course plus so much for each tablet loaded on an evening and each mg/L
 * of fast chlorine put in on an evening. Chlorine losses are close to first order, so the true course of a good plan lies
 * within a few hundredths of it in stabilized water; the finalists are projected in full.
 */
export function responseOf(context: PlanContext, evenings: Choice['evenings'], tablets: TabletOption | null): Response {
  const members = [context.median, ...context.members.slice(0, SCREENING_MEMBERS)];
  const { pool, preferences } = context.scenario;
  const run = (member: Member, doses: readonly WeekDose[]) =>
    seriesOf(integrateWeek(context.forcing, member.start, [...context.given, ...doses], member.setting));
  const base = members.map((member) => run(member, []));
  const end = (series: Series, key: 'totalAlkalinity' | 'cyanuricAcid') => series[key].at(-1)!;
  const answerTo = (dose: WeekDose, amount: number): Answer => {
    const courses = members.map((member) => run(member, [dose]));
    const median = (key: 'totalAlkalinity' | 'cyanuricAcid') => (end(courses[0]!, key) - end(base[0]!, key)) / amount;
    const rows = courses.map(({ freeChlorine }, member) =>
      Float64Array.from(freeChlorine, (value, hour) => (value - base[member]!.freeChlorine[hour]!) / amount),
    );
    const pH = Float64Array.from(courses[0]!.pH, (value, hour) => (value - base[0]!.pH[hour]!) / amount);
    return { rows, pH, totalAlkalinity: median('totalAlkalinity'), cyanuricAcid: median('cyanuricAcid') };
  };

  const tabletEvenings = tablets && tablets.most > 0 ? Math.min(TABLET_EVENINGS, evenings.length) : 0;
  const probeTablets = tablets ? Math.max(1, Math.round(tablets.most / 2)) : 0;
  const tabletAnswers = evenings.slice(0, tabletEvenings).map(({ at }) => {
    const { tabletMass, strength } = tablets!;
    return answerTo(
      { at, kind: 'tablets', load: { tabletMass, strength, count: probeTablets, erodedShare: 0 } },
      probeTablets,
    );
  });
  const liquid = { substance: 'sodium-hypochlorite', strength: 12.5 } as const;
  const perUnit = riseOf(contentsPerUnit(liquid), 1, pool.volume);
  const fastAnswers = evenings.map(({ at }) =>
    answerTo(weekDose(at, { ...liquid, amount: PROBE_RISE / perUnit }, pool.volume), PROBE_RISE),
  );

  const baseRows = base.map(({ freeChlorine }) => Float64Array.from(freeChlorine));
  const rows = baseRows.map((row) => new Float64Array(row.length));
  const memberRows = rows.slice(1);
  const pH = new Float64Array(context.hours.length);
  const lowestOf = remember(
    (draft: Draft) => lowestLevels(draft, tabletAnswers, base[0]!, stabilizedIn(draft, context)),
    ({ tablets, tabletEvening }) => tablets * TABLET_EVENINGS + tabletEvening,
  );
  const measureRises = remember(
    (fast: FastOption) => evenings.map(({ at }) => riseOfFast(fast, fast.measure, at, pool.volume)),
    (fast) => fast.product.id,
  );

  const cost = (draft: Draft, choice: Choice): number => {
    const parts: [amount: number, answer: Answer][] = [];
    if (draft.tablets > 0) parts.push([draft.tablets, tabletAnswers[draft.tabletEvening]!]);
    if (choice.fast) {
      const each = measureRises(choice.fast);
      draft.measures.forEach((measures, evening) => {
        if (measures > 0) parts.push([measures * each[evening]!, fastAnswers[evening]!]);
      });
    }
    pH.set(base[0]!.pH);
    let totalAlkalinity = end(base[0]!, 'totalAlkalinity');
    let cyanuricAcid = end(base[0]!, 'cyanuricAcid');
    for (let member = 0; member < rows.length; member++) rows[member]!.set(baseRows[member]!);
    for (const [amount, answer] of parts) {
      addScaled(pH, answer.pH, amount);
      totalAlkalinity += amount * answer.totalAlkalinity;
      cyanuricAcid += amount * answer.cyanuricAcid;
      for (let member = 0; member < rows.length; member++) addScaled(rows[member]!, answer.rows[member]!, amount);
    }
    const risk = riskOf(memberRows, rows[0]!, lowestOf(draft), context);
    const first = context.start.water;
    const hardness = base[0]!.calciumHardness.at(-1)! + calciumOf(draft, choice, pool.volume);
    return (
      preferences.money * moneyOf(draft, choice) +
      preferences.evenings * weights.visit * visitsOf(draft) +
      preferences.steadiness * (risk.shortfall + risk.excess) +
      stabilizerPrice(cyanuricAcid, context) +
      hardnessPrice(hardness, context) +
      pHPrice(first, pH, totalAlkalinity, context)
    );
  };
  return { cost, tabletEvenings, measureRises };
}

function addScaled(row: Float64Array, answer: Float64Array, amount: number): void {
  for (let hour = 0; hour < row.length; hour++) row[hour]! += amount * answer[hour]!;
}

/** Lowest level hour by hour, stabilizer taken as rising evenly to where the tablets bring it. */
function lowestLevels(
  { tablets, tabletEvening }: Draft,
  answers: readonly Answer[],
  base: Series,
  stabilized: boolean,
) {
  const rise = tablets > 0 ? tablets * answers[tabletEvening]!.cyanuricAcid : 0;
  const last = base.cyanuricAcid.length - 1;
  return Float64Array.from(base.cyanuricAcid, (stabilizer, hour) =>
    lowestLevel(stabilizer + (rise * hour) / last, stabilized),
  );
}

/** Hardness that the granules of a draft add [mg/L as CaCO3]. */
function calciumOf(draft: Draft, { fast, evenings }: Choice, volume: number): number {
  if (!fast || fast.form !== 'granular') return 0;
  const amount = draft.measures.reduce((sum, measures) => sum + measures, 0) * fast.measure;
  if (amount === 0) return 0;
  const contents = contentsPerUnit(fast.dose(amount, evenings[0]!.at));
  return (contents.calcium * amount * HARDNESS_MILLIGRAMS_PER_MOLE) / (volume * 1000);
}

/** Computes once for each key. */
function remember<Input, Output>(compute: (input: Input) => Output, keyOf: (input: Input) => unknown) {
  const known = new Map<unknown, Output>();
  return (input: Input): Output => {
    const key = keyOf(input);
    const value = known.get(key) ?? compute(input);
    known.set(key, value);
    return value;
  };
}
