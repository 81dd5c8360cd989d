import { constantsOfLedger, speciesOfLedger } from '@/lib/chemistry';
import type { Member } from '@/lib/projection/ensemble';
import { riseOf } from '@/lib/projection/events';
import { HOURS_IN_PLAN, MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import { actingIn, type Course, ledgerAt } from '@/lib/projection/integrate';
import { holdRates, lightThroughDepth, lossUnderSun, newStepRates, noRelease } from '@/lib/projection/step';
import { lifeOf, massLeft, type TabletLoad } from '@/lib/projection/tablets';
import type { PlanContext } from './context';
import { remember } from './remember';

/** Tablets that a draft adds, and from which hour on. */
export type AddedTablets = { load: TabletLoad; from: number };

/** A few members at once. Series stand hour by hour, the members side by side: [hour * members + member]. */
export type QuickWeek = {
  /** What tablets release less what swimmers take [mg/L/h]; `pump` is its share of each hour. */
  sourceOf: (tablets: readonly AddedTablets[], pump: Float64Array) => Float64Array;
  /**
   * Free chlorine at every hour [mg/L] into `levels`.
   *
   * @param rises  what a draft adds at each hour [g/m3 of the entered volume]
   * @param source from `sourceOf`
   * @param count  of the tablets that a draft adds
   */
  run: (rises: Float64Array, source: Float64Array, count: number, levels: Float64Array) => void;
};

/** A member, its course without anything of the plan, and one with some tablets if there may be any. */
export type QuickMember = { member: Member; undosed: Course; withTablets: Course | null };

/** The loss under sun is measured at these levels [mg/L]; a parabola runs through them. */
const LEVELS = [0.5, 3, 7] as const;
const HOURS_OF_ONE_SPECIATION = 6;

/**
 * A quick week: free chlorine alone, in hourly steps. The loss under sun that follows from pH, stabilizer and temperature
 * is taken from two courses in full, one in which nothing more goes in and one with tablets, and in between by their count;
 * swimmers and dilution are as they are. Within about a tenth of a mg/L of the full projection in stabilized water: enough
 * to compare a great many drafts; what is found is projected in full.
 *
 * @param probeCount tablets in the courses with tablets
 */
export function quickWeek(context: PlanContext, quickMembers: readonly QuickMember[], probeCount: number): QuickWeek {
  const { forcing, scenario } = context;
  const members = quickMembers.length;
  const parameters = quickMembers.map(({ member }) => member.setting.parameters);
  const byMember = (valueOf: (member: number) => number) =>
    Float64Array.from(parameters, (_, member) => valueOf(member));
  const start = byMember((member) => quickMembers[member]!.member.start.ledger.freeChlorine);
  const ofVolume = byMember((member) => scenario.pool.volume / parameters[member]!.volume);

  const losses = lossesOf(context, quickMembers, ({ undosed }) => undosed);
  const tabletLosses = lossesOf(context, quickMembers, ({ undosed, withTablets }) => withTablets ?? undosed);
  const lossesWith = remember((count: number) => between(losses, tabletLosses, count / probeCount));

  const jumps = new Float64Array((HOURS_IN_PLAN + 1) * members);
  const kept = new Float64Array((HOURS_IN_PLAN + 1) * members).fill(1);
  const given = new Set<number>();
  for (const dose of context.given) {
    const hour = hourOf(dose.at, forcing);
    if (dose.kind === 'tablets' || hour < 0 || hour > HOURS_IN_PLAN) continue;
    const { contents, amount } = dose;
    given.add(hour);
    parameters.forEach(({ volume }, member) => (jumps[hour * members + member]! += riseOf(contents, amount, volume)));
  }
  for (const { at, volume } of forcing.backwashes) {
    given.add(hourOf(at, forcing));
    parameters.forEach((each, member) => {
      kept[hourOf(at, forcing) * members + member]! *= 1 - Math.min(1, volume / each.volume);
    });
  }

  return {
    sourceOf: (tablets, pump) => {
      const source = losses.demand.map((demand) => -demand);
      quickMembers.forEach(({ member }, index) => {
        for (const load of member.start.loads) addRelease(source, { load, from: 0 }, pump, member, index, members);
        for (const dose of context.given)
          if (dose.kind === 'tablets' && dose.at >= forcing.startsAt)
            addRelease(source, { load: dose.load, from: hourOf(dose.at, forcing) }, pump, member, index, members);
        for (const added of tablets) addRelease(source, added, pump, member, index, members);
      });
      return source;
    },
    run: (rises, source, count, levels) => {
      const { constant, linear, square } = lossesWith(count);
      levels.set(start);
      for (let at = 0, hour = 0; hour <= HOURS_IN_PLAN; hour++) {
        const rise = rises[hour]!;
        if (rise > 0 || given.has(hour)) {
          for (let member = 0; member < members; member++) {
            const sum = levels[at + member]! * kept[at + member]! + jumps[at + member]! + rise * ofVolume[member]!;
            levels[at + member] = sum > 0 ? sum : 0;
          }
        }
        if (hour === HOURS_IN_PLAN) break;
        for (let member = 0; member < members; member++, at++) {
          const before = levels[at]!;
          const parabola = constant[at]! + before * (linear[at]! + before * square[at]!);
          const loss = parabola > 0 ? parabola : 0;
          // exp(-loss) and its mean over the hour, by their series: exact to a thousandth where a tenth is lost in an hour.
          const level = (before + source[at]! * (1 + 0.5 * loss)) / (1 + loss + 0.5 * loss * loss);
          levels[at + members] = level > 0 ? level : 0;
        }
      }
    },
  };
}

/** The first hour of the week at or after an instant [ms]. */
export function hourOf(at: number, { startsAt }: { startsAt: number }): number {
  return Math.ceil((at - startsAt) / MILLISECONDS_PER_HOUR);
}

/** Adds what tablets release in each hour to one member's part of `source`. */
function addRelease(
  source: Float64Array,
  { load, from }: AddedTablets,
  pump: Float64Array,
  { setting }: Member,
  index: number,
  members: number,
): void {
  const { volume, tabletLife } = setting.parameters;
  const chlorine = (load.count * load.tabletMass * load.strength) / 100 / volume;
  const life = lifeOf(load.tabletMass, tabletLife);
  let eroded = load.erodedShare;
  let left = massLeft(eroded);
  for (let hour = from; hour < HOURS_IN_PLAN && eroded < 1; hour++) {
    const running = setting.floater ? 1 : pump[hour]!;
    if (running === 0) continue;
    eroded += running / life;
    const after = massLeft(eroded);
    source[hour * members + index]! += chlorine * (left - after);
    left = after;
  }
}

/** First-order loss in each hour as constant + linear C + square C^2 [1/h, C in mg/L], and what swimmers take [mg/L/h]. */
type Losses = Record<'constant' | 'linear' | 'square' | 'demand', Float64Array>;

function between(from: Losses, to: Losses, share: number): Losses {
  const mix = (key: keyof Losses) => from[key].map((value, at) => value + share * (to[key][at]! - value));
  return share === 0
    ? from
    : { constant: mix('constant'), linear: mix('linear'), square: mix('square'), demand: from.demand };
}

function lossesOf(
  { forcing }: PlanContext,
  quickMembers: readonly QuickMember[],
  courseOf: (each: QuickMember) => Course,
): Losses {
  const series = () => new Float64Array(HOURS_IN_PLAN * quickMembers.length);
  const losses = { constant: series(), linear: series(), square: series(), demand: series() };
  const rates = newStepRates();
  quickMembers.forEach((each, index) => {
    const { setting } = each.member;
    const course = courseOf(each);
    const body = { depth: setting.depth, light: lightThroughDepth(setting.depth) };
    let underSun: readonly number[] = [];
    for (let hour = 0; hour < HOURS_IN_PLAN; hour++) {
      if (hour % HOURS_OF_ONE_SPECIATION === 0) {
        const ledger = ledgerAt(course, hour);
        const constants = constantsOfLedger(ledger);
        const rateAt = (level: number) => {
          const species = speciesOfLedger({ ...ledger, freeChlorine: level }, course.pH[hour]!, constants);
          return lossUnderSun(species, setting.parameters.boundPhotolysis) / level;
        };
        underSun = parabola(LEVELS, LEVELS.map(rateAt));
      }
      holdRates(rates, actingIn(forcing, hour), noRelease, setting.parameters, body);
      const at = hour * quickMembers.length + index;
      losses.demand[at] = rates.swimmerDemand;
      losses.constant[at] = rates.darkDemand + rates.outflow + rates.light * underSun[0]!;
      losses.linear[at] = rates.light * underSun[1]!;
      losses.square[at] = rates.light * underSun[2]!;
    }
  });
  return losses;
}

/** Coefficients of the parabola through three points, the constant first. */
function parabola([a, b, c]: readonly [number, number, number], [fa, fb, fc]: readonly number[]): number[] {
  const slope = (fb! - fa!) / (b - a);
  const square = ((fc! - fb!) / (c - b) - slope) / (c - a);
  const linear = slope - square * (a + b);
  return [fa! - a * (linear + a * square), linear, square];
}
