import { constantsOfLedger, speciesOfLedger } from '@/lib/chemistry';
import { CYANURIC_ACID_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import type { Member } from '@/lib/projection/ensemble';
import { riseOf } from '@/lib/projection/events';
import { HOURS_IN_PLAN, MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import { actingIn, type Course, ledgerAt } from '@/lib/projection/integrate';
import { holdRates, lightThroughDepth, lossUnderSun, newStepRates, noRelease } from '@/lib/projection/step';
import { lifeOf, massLeft, type TabletLoad } from '@/lib/projection/tablets';
import type { PlanContext, Undosed } from './context';

/** Tablets that a draft adds, and from which hour on. */
export type AddedTablets = { load: TabletLoad; from: number };

/** A few members at once. Series stand hour by hour, the members side by side: [hour * members + member]. */
export type QuickWeek = {
  /** What tablets of before release less what swimmers take [mg/L/h]; `pump` is its share of each hour. */
  sourceOf: (pump: Float64Array) => Float64Array;
  /** What tablets of a draft release [mg/L/h]. */
  releaseOf: (tablets: AddedTablets, pump: Float64Array) => Float64Array;
  /**
   * What is left of the loss under sun with more stabilizer [1].
   *
   * @param stabilizer how much more, by hour [mg/L]
   */
  shelteredBy: (stabilizer: Float64Array) => Float64Array;
  /** What holds for every draft. */
  frame: QuickFrame;
};

/** What a quick week of every draft shares; series by hour and member as above. */
export type QuickFrame = {
  members: number;
  /** Free chlorine at the start [mg/L]. */
  start: Float64Array;
  /** Entered volume over the member's. */
  ofVolume: Float64Array;
  /** Whether something happens at an hour beside the draft: what that adds [mg/L], after what share of the water is kept. */
  happens: Uint8Array;
  jumps: Float64Array;
  kept: Float64Array;
  losses: Losses;
};

/** The loss under sun is measured at these levels [mg/L]; a parabola runs through them. */
const LEVELS = [0.5, 3, 7] as const;
const USUAL_LEVEL = LEVELS[1];
/** How far pH and stabilizer [mg/L] are moved to see what that does to the loss. */
const PH_PROBE = 0.05;
const STABILIZER_PROBE = 3;
const HOURS_OF_ONE_SPECIATION = 6;

/**
 * A quick week: free chlorine alone, in hourly steps. The loss under sun follows from pH, stabilizer and temperature of the
 * week in which nothing more goes in, and from how a draft moves pH and stabilizer away from it; swimmers and dilution are
 * as they are. Within a few hundredths of a mg/L of the full projection in stabilized water: enough to compare a great many
 * drafts; what is found is projected in full.
 */
export function quickWeek(context: PlanContext, quickMembers: readonly Undosed[]): QuickWeek {
  const { forcing, scenario } = context;
  const members = quickMembers.length;
  const parameters = quickMembers.map(({ member }) => member.setting.parameters);
  const byMember = (valueOf: (member: number) => number) =>
    Float64Array.from(parameters, (_, member) => valueOf(member));
  const start = byMember((member) => quickMembers[member]!.member.start.ledger.freeChlorine);
  const ofVolume = byMember((member) => scenario.pool.volume / parameters[member]!.volume);

  const { losses, demand } = lossesOf(context, quickMembers);

  const jumps = new Float64Array((HOURS_IN_PLAN + 1) * members);
  const kept = new Float64Array((HOURS_IN_PLAN + 1) * members).fill(1);
  const happens = new Uint8Array(HOURS_IN_PLAN + 1);
  for (const dose of context.given) {
    const hour = hourOf(dose.at, forcing);
    if (dose.kind === 'tablets' || hour < 0 || hour > HOURS_IN_PLAN) continue;
    const { contents, amount } = dose;
    happens[hour] = 1;
    parameters.forEach(({ volume }, member) => (jumps[hour * members + member]! += riseOf(contents, amount, volume)));
  }
  for (const { at, volume } of forcing.backwashes) {
    happens[hourOf(at, forcing)] = 1;
    parameters.forEach((each, member) => {
      kept[hourOf(at, forcing) * members + member]! *= 1 - Math.min(1, volume / each.volume);
    });
  }

  return {
    sourceOf: (pump) => {
      const source = demand.map((taken) => -taken);
      quickMembers.forEach(({ member }, index) => {
        for (const load of member.start.loads) addRelease(source, { load, from: 0 }, pump, member, index, members);
        for (const dose of context.given)
          if (dose.kind === 'tablets' && dose.at >= forcing.startsAt)
            addRelease(source, { load: dose.load, from: hourOf(dose.at, forcing) }, pump, member, index, members);
      });
      return source;
    },
    releaseOf: (tablets, pump) => {
      const release = new Float64Array(demand.length);
      quickMembers.forEach(({ member }, index) => addRelease(release, tablets, pump, member, index, members));
      return release;
    },
    shelteredBy: (stabilizer) =>
      losses.perStabilizer.map((per, at) => 1 / (1 + per * stabilizer[Math.floor(at / members)]!)),
    frame: { members, start, ofVolume, happens, jumps, kept, losses },
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

/**
 * First-order loss in each hour: dark + (constant + linear C + square C^2) exp(perPH dpH) / (1 + perStabilizer dCya) [1/h],
 * C in mg/L, the last two being how far a draft moves pH and stabilizer [mg/L].
 */
export type Losses = Record<'dark' | 'constant' | 'linear' | 'square' | 'perPH' | 'perStabilizer', Float64Array> & {
  /** Whether the sun acts on the water in an hour. */
  sunny: Uint8Array;
};

/** Losses of all members, and what swimmers take [mg/L/h]. */
function lossesOf({ forcing }: PlanContext, quickMembers: readonly Undosed[]) {
  const series = () => new Float64Array(HOURS_IN_PLAN * quickMembers.length);
  const losses: Losses = {
    ...{ dark: series(), constant: series(), linear: series(), square: series() },
    ...{ perPH: series(), perStabilizer: series() },
    sunny: Uint8Array.from(forcing.sun, (sun) => (sun > 0 ? 1 : 0)),
  };
  const demand = series();
  const rates = newStepRates();
  quickMembers.forEach(({ member: { setting }, undosed }, index) => {
    const body = { depth: setting.depth, light: lightThroughDepth(setting.depth) };
    let underSun: ReturnType<typeof lossUnderSunAt> | null = null;
    for (let hour = 0; hour < HOURS_IN_PLAN; hour++) {
      if (hour % HOURS_OF_ONE_SPECIATION === 0) underSun = null;
      holdRates(rates, actingIn(forcing, hour), noRelease, setting.parameters, body);
      const at = hour * quickMembers.length + index;
      demand[at] = rates.swimmerDemand;
      losses.dark[at] = rates.darkDemand + rates.outflow;
      if (losses.sunny[hour] === 0) continue;
      underSun ??= lossUnderSunAt(undosed, hour, setting.parameters.boundPhotolysis);
      losses.constant[at] = rates.light * underSun.constant;
      losses.linear[at] = rates.light * underSun.linear;
      losses.square[at] = rates.light * underSun.square;
      losses.perPH[at] = underSun.perPH;
      losses.perStabilizer[at] = underSun.perStabilizer;
    }
  });
  return { losses, demand };
}

/** First-order loss under the reference sun [1/h] in the water of a course at an hour, as in {@link Losses}. */
function lossUnderSunAt(course: Course, hour: number, boundPhotolysis: number) {
  const ledger = ledgerAt(course, hour);
  const constants = constantsOfLedger(ledger);
  const rateAt = (level: number, pH: number, stabilizer = 0) => {
    ledger.freeChlorine = level;
    const { cyanurate } = ledger;
    ledger.cyanurate += stabilizer / CYANURIC_ACID_MILLIGRAMS_PER_MOLE;
    const rate = lossUnderSun(speciesOfLedger(ledger, pH, constants), boundPhotolysis) / level;
    ledger.cyanurate = cyanurate;
    return rate;
  };
  const pH = course.pH[hour]!;
  const rates = LEVELS.map((level) => rateAt(level, pH));
  const [constant, linear, square] = parabola(LEVELS, rates);
  const usual = rates[1]!;
  return {
    constant,
    linear,
    square,
    perPH: Math.log(rateAt(USUAL_LEVEL, pH + PH_PROBE) / rateAt(USUAL_LEVEL, pH - PH_PROBE)) / (2 * PH_PROBE),
    perStabilizer: (usual / rateAt(USUAL_LEVEL, pH, STABILIZER_PROBE) - 1) / STABILIZER_PROBE,
  };
}

/** Coefficients of the parabola through three points, the constant first. */
function parabola([a, b, c]: readonly [number, number, number], [fa, fb, fc]: readonly number[]) {
  const slope = (fb! - fa!) / (b - a);
  const square = ((fc! - fb!) / (c - b) - slope) / (c - a);
  const linear = slope - square * (a + b);
  return [fa! - a * (linear + a * square), linear, square] as const;
}
