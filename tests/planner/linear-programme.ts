import type { Highs } from 'highs';
import type { PlanContext } from '@/lib/planner/context';
import { type Choice, type Draft, tabletDose } from '@/lib/planner/draft';
import { mostMeasures } from '@/lib/planner/moves';
import { type FastOption, riseOfFast } from '@/lib/planner/products';
import { weights } from '@/lib/planner/weights';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import { integrateWeek } from '@/lib/projection/integrate';
import { codeMinimum } from '@/lib/standards/limits';

const HOURS_APART = 4;
const MEMBERS = 2;
const MILLIGRAMS_OF_STABILIZER = 129_074;
/** More than any shortfall or excess [mg/L]. */
const LARGE = 30;

/** How the free chlorine of one pool answers to each unit of each dose: hour by hour. */
type Answers = { without: Float64Array; to: Float64Array[] };

/**
 * The week as a mixed-integer linear programme in the text form of an LP file: levels are those without doses plus what a
 * tablet and a measure on each evening add, measured by one projection each; whole tablets and measures; visits; shortfall,
 * excess and closed swim hours at every fourth hour, for the median and a few of the ensemble. Side effects cost nothing.
 */
function linearProgramme(context: PlanContext, { evenings, visits, tablets }: Choice, fast: FastOption): string {
  const { scenario, forcing, given, median, swimHour, swimCeiling } = context;
  const { preferences, pool } = scenario;
  const rises = evenings.map(({ at }) => riseOfFast(fast, fast.measure, at, pool.volume));
  const most = mostMeasures(fast, rises);
  const probes = [
    ...evenings.map(({ at }): [string, WeekDose, number] => ['t', tabletDose(tablets!, 2, at), 2]),
    ...evenings.map(({ at }, evening): [string, WeekDose, number] => {
      const count = Math.max(1, Math.round(2 / rises[evening]!));
      return ['x', weekDose(at, fast.dose(count * fast.measure, at), pool.volume), count];
    }),
  ];
  const names = probes.map(([letter], index) => `${letter}${index % evenings.length}`);
  const answersOf = (of: 'freeChlorine' | 'cyanurate', { start, setting }: PlanContext['median']): Answers => {
    const run = (doses: WeekDose[]) => integrateWeek(forcing, start, [...given, ...doses], setting).hourly[of];
    const without = run([]);
    const to = probes.map(([, dose, count]) => run([dose]).map((level, hour) => (level - without[hour]!) / count));
    return { without, to };
  };
  const sumAt = ({ to }: Answers, hour: number, factor = 1) =>
    to.map((answer, index) => term(factor * answer[hour]!, names[index]!)).join(' ');

  const cost: string[] = [];
  const rows: string[] = [];
  const binaries: string[] = evenings.flatMap((_, evening) => [`l${evening}`, `f${evening}`]);
  const stabilizer = answersOf('cyanurate', median);
  const perLevel = MILLIGRAMS_OF_STABILIZER / 20;
  const pools = [median, ...context.members.slice(1, 1 + MEMBERS)];
  pools.forEach((member, index) => {
    const levels = answersOf('freeChlorine', member);
    const expected = (preferences.steadiness * HOURS_APART) / MEMBERS;
    const ofMedian = preferences.steadiness * HOURS_APART;
    const under = index === 0 ? ofMedian * weights.medianShortfall : expected * weights.shortfall;
    const over = index === 0 ? ofMedian * weights.medianExcess : expected * weights.excess;
    for (let hour = HOURS_APART; hour < swimHour.length; hour += HOURS_APART) {
      const [short, excess] = [`s${index}_${hour}`, `e${index}_${hour}`];
      const level = levels.without[hour]!;
      cost.push(term(under, short));
      rows.push(`${short} ${sumAt(levels, hour)} >= ${figure(codeMinimum(50, true) - level)}`);
      const lowest = stabilizer.without[hour]! * perLevel;
      rows.push(`${short} ${sumAt(levels, hour)} ${sumAt(stabilizer, hour, -perLevel)} >= ${figure(lowest - level)}`);
      if (!swimHour[hour]) continue;
      cost.push(term(over, excess));
      rows.push(`${excess} ${sumAt(levels, hour, -1)} >= ${figure(level - swimCeiling[hour]!)}`);
      if (index > 0) continue;
      cost.push(term(ofMedian * weights.closedSwimHour, `c${hour}`));
      rows.push(`${short} + ${excess} - ${LARGE} c${hour} <= 0`);
      binaries.push(`c${hour}`);
    }
  });

  evenings.forEach((_, evening) => {
    cost.push(term(preferences.evenings * weights.visit, `l${evening}`));
    cost.push(term(preferences.evenings * weights.visit, `f${evening}`));
    cost.push(term(preferences.money * tablets!.price, `t${evening}`));
    cost.push(term(preferences.money * fast.measurePrice, `x${evening}`));
    rows.push(`t${evening} - ${tablets!.most} l${evening} <= 0`, `x${evening} - ${most[evening]} f${evening} <= 0`);
    rows.push(`l${evening} + f${evening} <= 1`);
  });
  const all = (letter: string) => evenings.map((_, evening) => `${letter}${evening}`).join(' + ');
  rows.push(`${all('l')} + ${all('f')} <= ${visits}`, `${all('l')} <= 2`, `${all('t')} <= ${tablets!.most}`);
  return [
    `Minimize\n cost: ${cost.join(' ')}`,
    `Subject To\n${rows.map((row, index) => ` r${index}: ${row}`).join('\n')}`,
    `General\n ${names.join(' ')}`,
    `Binary\n ${binaries.join(' ')}`,
    'End\n',
  ].join('\n');
}

/** Exact: no gap is left, and the same every time. */
const exactly = { mip_rel_gap: 0, mip_abs_gap: 0, threads: 1, random_seed: 1, output_flag: false };

/** The draft that solves the linear problem exactly. */
export function solveLinearly(highs: Highs, context: PlanContext, choice: Choice, fast: FastOption): Draft {
  const solution = highs.solve(linearProgramme(context, choice, fast), exactly);
  if (solution.Status !== 'Optimal') throw new Error(`The linear problem is ${solution.Status}.`);
  const columns = solution.Columns as Record<string, { Primal?: number }>;
  return draftOf((name) => columns[name]?.Primal ?? NaN, choice, fast);
}

/** The draft that a solution stands for. */
function draftOf(value: (name: string) => number, { evenings }: Choice, fast: FastOption): Draft {
  const whole = (letter: string) => evenings.map((_, evening) => Math.round(value(`${letter}${evening}`)));
  return { tablets: whole('t'), fast, measures: whole('x') };
}

function term(factor: number, name: string): string {
  return `${factor < 0 ? '-' : '+'} ${figure(Math.abs(factor))} ${name}`;
}

function figure(value: number): string {
  return value.toFixed(9);
}
