import { addDays, dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { type Ledger, ledgerOf, type WaterAnalysis } from '@/lib/chemistry';
import type { DayConditions, PoolHistory } from '@/lib/learning';
import { analysisAt, settingOf, type TabletLoad } from '@/lib/projection';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import { prepareForcing } from '@/lib/projection/forcing';
import { type CourseSetting, integrateWeek, ledgerAt } from '@/lib/projection/integrate';
import { type Parameters, parametersOf, priorSigma } from '@/lib/projection/parameters';
import { readingError, type UncertainQuantity, uncertainQuantities } from '@/lib/projection/reading-error';
import { measuredRange } from '@/lib/schemas/measured-range';
import type { Pool } from '@/lib/schemas/pool';
import { learnableParameters } from '@/lib/schemas/posterior';
import type { Reading } from '@/lib/schemas/reading';
import { type WeekAhead, weekAheadSchema } from '@/lib/schemas/week-ahead';
import { aPool } from '../projection/pools';

export const HOUR = 3_600_000;
export const WEEK = 168 * HOUR;
const firstReading = Date.parse('2026-05-03T18:00:00-04:00');

/** Repeatable numbers from 0 to 1. */
export function randomNumbers(seed: number): () => number {
  let state = seed;
  return () => {
    state = (state + 0x6d2b79f5) | 0;
    let mixed = Math.imul(state ^ (state >>> 15), 1 | state);
    mixed = (mixed + Math.imul(mixed ^ (mixed >>> 7), 61 | mixed)) ^ mixed;
    return ((mixed ^ (mixed >>> 14)) >>> 0) / 2 ** 32;
  };
}

/** A pool whose every hour is known, with what its household wrote down. */
export type SimulatedPool = {
  pool: Pool;
  truth: Parameters;
  history: PoolHistory;
  /** The true water and feeder at each reading, and the true free chlorine of the hours of the week after it. */
  weeks: { water: WaterAnalysis; loads: TabletLoad[]; freeChlorine: Float64Array }[];
};

/**
 * A household that tests each week with a drop kit and doses as households do: more when chlorine is low, tablets in some
 * weeks, acid when pH is high. Truth is drawn from the priors, tests from the method's errors; both by another source of
 * numbers than the product's own points.
 */
export function simulatedPool(seed: number, readings = 8): SimulatedPool {
  const random = randomNumbers(seed);
  const normal = () => Math.sqrt(-2 * Math.log(1 - random())) * Math.cos(2 * Math.PI * random());
  const pool = aPool({
    volume: 20 + 100 * random(),
    sunExposure: 0.5 + 0.5 * random(),
    feeder: { kind: 'inline', ingredient: 'trichlor', capacity: 8 },
  });
  const truth: Parameters = parametersOf(pool);
  for (const name of learnableParameters) truth[name] *= Math.exp(priorSigma[name] * normal());
  const temperature = 22 + 10 * random();
  const setting: CourseSetting = { ...settingOf(pool, temperature), parameters: truth };

  let ledger = ledgerOf({
    freeChlorine: 1 + 3 * random(),
    combinedChlorine: 0.2,
    pH: 7.2 + 0.6 * random(),
    totalAlkalinity: 70 + 50 * random(),
    calciumHardness: 150 + 200 * random(),
    cyanuricAcid: 20 + 50 * random(),
    temperature,
  });
  let pH = 7.5;
  let loads: TabletLoad[] = [];
  const sim: SimulatedPool = {
    pool,
    truth,
    history: { pool, readings: [], doses: [], days: {}, tabletsLeft: [], loads: [] },
    weeks: [],
  };
  const taken: Reading[] = [];
  const doses: WeekDose[] = [];
  const days: Record<string, DayConditions> = {};
  for (let week = 0; week < readings; week++) {
    const at = firstReading + week * WEEK;
    const water = analysisAt(ledger, week === 0 ? analysisOfStart(ledger) : pH);
    const reading = readingOf(water, at, normal);
    taken.push(reading);
    const given = dosesAfter(reading, at, pool, random);
    doses.push(...given);
    const forcing = forcingOf(pool, at, temperature, days, random);
    sim.weeks.push({ water, loads: loads.map((load) => ({ ...load })), freeChlorine: new Float64Array() });
    const course = integrateWeek(forcing, { ledger, loads }, given, setting);
    sim.weeks.at(-1)!.freeChlorine = course.hourly.freeChlorine;
    ledger = ledgerAt(course, 168);
    pH = course.pH[168]!;
    loads = course.loads.filter(({ erodedShare }) => erodedShare < 1);
  }
  sim.history = { ...sim.history, readings: taken, doses, days };
  return sim;
}

function analysisOfStart(ledger: Ledger): number {
  const forcing = prepareForcing(aPool(), 0, weekAheadSchema.parse({}), ledger.temperature, { hours: 1 });
  return integrateWeek(forcing, { ledger, loads: [] }, [], settingOf(aPool(), ledger.temperature)).pH[0]!;
}

/** A drop kit's reading of a water, with its errors. */
export function readingOf(water: WaterAnalysis, at: number, normal: () => number): Reading {
  const measured = {} as Record<UncertainQuantity, number>;
  for (const quantity of uncertainQuantities) {
    const [low, high] = measuredRange[quantity];
    const error = readingError(quantity, water[quantity], 'drop-kit') * normal();
    measured[quantity] = Math.min(high, Math.max(low, water[quantity] + error));
  }
  return {
    takenAt: toOffsetIso(at, 'America/New_York'),
    method: 'drop-kit',
    ...measured,
    temperature: water.temperature,
  };
}

function dosesAfter(reading: Reading, at: number, pool: Pool, random: () => number): WeekDose[] {
  const doses: WeekDose[] = [];
  const { freeChlorine, pH } = reading as { freeChlorine: number; pH: number };
  const tablets = Math.round((random() * pool.volume) / 22);
  if (tablets > 0 && freeChlorine < 5)
    doses.push({
      at: at + 2 * HOUR,
      kind: 'tablets',
      load: { count: tablets, tabletMass: 227, strength: 90, erodedShare: 0 },
    });
  for (const day of [1, 3, 5]) {
    const rise = Math.max(0, 4.5 - freeChlorine) * random();
    if (rise > 0.5)
      doses.push(
        weekDose(
          at + day * 24 * HOUR + HOUR,
          { substance: 'sodium-hypochlorite', amount: rise * 8 * pool.volume, strength: 12.5 },
          pool.volume,
        ),
      );
  }
  if (pH > 7.7)
    doses.push(weekDose(at + 42 * HOUR, { substance: 'hydrochloric-acid', amount: 8 * pool.volume }, pool.volume));
  if (pH < 7.1)
    doses.push(weekDose(at + 42 * HOUR, { substance: 'sodium-carbonate', amount: 6 * pool.volume }, pool.volume));
  return doses;
}

function forcingOf(
  pool: Pool,
  at: number,
  temperature: number,
  days: Record<string, DayConditions>,
  random: () => number,
) {
  const first = dayOf(at, pool.timeZone);
  const sky: number[] = [];
  const swimmerHours: number[] = [];
  const rain: number[] = [];
  for (let index = 0; index < 8; index++) {
    const day = addDays(first, index);
    days[day] ??= {
      sky: 0.5 + 0.5 * random(),
      swimmerHours: Math.floor(9 * random()),
      rain: random() < 0.15 ? 15 * random() : 0,
    };
    sky.push(days[day].sky!);
    swimmerHours.push(days[day].swimmerHours!);
    rain.push(days[day].rain!);
  }
  return prepareForcing(pool, at, weekAheadSchema.parse({ sky, swimmerHours, rain }), temperature);
}

/** What the days after a reading brought, as the household wrote it down. */
export function weekAfter({ pool, history }: SimulatedPool, reading: number): WeekAhead {
  const first = dayOf(firstReading + reading * WEEK, pool.timeZone);
  const each = (name: keyof DayConditions) =>
    Array.from({ length: 8 }, (_, index) => history.days[addDays(first, index)]![name]!);
  return weekAheadSchema.parse({ sky: each('sky'), swimmerHours: each('swimmerHours'), rain: each('rain') });
}
