import { dayOfEpochDay } from '@/lib/calendar/epoch-day';
import { epochDayAt, startOfEpochDay } from '@/lib/calendar/household-day';
import { type InstantInterval, intervalsOfEpochDay, wallToInstant } from '@/lib/calendar/wall-time';
import type { Pool } from '@/lib/schemas/pool';
import type { WeekAhead } from '@/lib/schemas/week-ahead';
import { sinesOfElevation } from '@/lib/sun/solar-position';
import { ultravioletWeightOfSine } from '@/lib/sun/ultraviolet';

export const HOURS_IN_PLAN = 168;
export const MILLISECONDS_PER_HOUR = 3_600_000;
const SUN_SAMPLES_PER_HOUR = 4;

/** Share of the sun that passes, and of the evaporation that is left, under each cover. */
export const coverPasses = {
  none: { sun: 1, evaporation: 1 },
  floating: { sun: 0.3, evaporation: 0.1 },
  opaque: { sun: 0, evaporation: 0.05 },
} as const;

/**
 * What acts on the water in each step of the week, whatever is dosed and whatever the parameters: means over the step.
 * One preparation serves every member of the ensemble and every candidate plan.
 */
export type Forcing = {
  /** First instant [ms] and length of a step [h]. */
  startsAt: number;
  stepHours: number;
  stepsPerHour: number;
  steps: number;
  /** sky * exposure * cover * (sin e / sin 66.4 deg)^2.42 [1], and the same for equal parts of each step. */
  sun: Float64Array;
  sunParts: Float64Array;
  /** Share of the step in which the pump runs by its own timer [1]. */
  pump: Float64Array;
  /** Share of the step in which the cover lies [1]. */
  covered: Float64Array;
  /** Evaporation under the cover and rain [m/h]. */
  evaporation: Float64Array;
  rain: Float64Array;
  /** Heads in the water [1]. */
  swimmers: Float64Array;
  /** Water temperature [degrees C]. */
  temperature: Float64Array;
  /** When the timer runs the pump, over the whole week. */
  pumpIntervals: InstantInterval[];
  /** Backwash: when, and how much water is replaced [m3]. */
  backwashes: { at: number; volume: number }[];
};

/**
 * Turns a pool's habits and the week ahead into means over steps. Days are the household's calendar days from the day of
 * `startsAt`; they are 23 to 25 hours long at clock changes, and steps fall where they fall.
 *
 * @param startsAt       first instant [ms]
 * @param temperature    water temperature where the week ahead names none [degrees C]
 * @param stepsPerHour   1 in the product; more for tests of the step
 * @param hours          length [h]
 */
export function prepareForcing(
  pool: Pool,
  startsAt: number,
  week: WeekAhead,
  temperature: number,
  { stepsPerHour = 1, hours = HOURS_IN_PLAN }: { stepsPerHour?: number; hours?: number } = {},
): Forcing {
  const steps = Math.max(1, Math.round(hours * stepsPerHour));
  const stepHours = hours / steps;
  const endsAt = startsAt + hours * MILLISECONDS_PER_HOUR;
  const series = () => new Float64Array(steps);
  const forcing: Forcing = {
    startsAt,
    stepHours,
    stepsPerHour,
    steps,
    sun: series(),
    sunParts: new Float64Array(steps * partsOf(stepHours)),
    pump: series(),
    covered: series(),
    evaporation: series(),
    rain: series(),
    swimmers: series(),
    temperature: series(),
    pumpIntervals: [],
    backwashes: [],
  };
  const passes = coverPasses[pool.cover];
  shine(forcing, pool);

  const firstDay = epochDayAt(startsAt, pool.timeZone);
  let whole = { from: 0, to: startOfEpochDay(firstDay, pool.timeZone) };
  for (let index = 0; whole.to < endsAt; index++) {
    const day = firstDay + index;
    whole = { from: whole.to, to: startOfEpochDay(day + 1, pool.timeZone) };
    const dayHours = hoursOf(whole);
    const swim = intervalsOfEpochDay([pool.swimHours], day, pool.timeZone);
    const swimHours = swim.reduce((sum, interval) => sum + hoursOf(interval), 0);
    const running = intervalsOfEpochDay(pool.pump, day, pool.timeZone);
    forcing.pumpIntervals.push(...running);
    for (const interval of running) addShare(forcing.pump, forcing, interval, 1);
    addShare(
      forcing.temperature,
      forcing,
      whole,
      week.waterTemperature ? lasting(week.waterTemperature, index) : temperature,
    );
    addShare(forcing.rain, forcing, whole, once(week.rain, index) / 1000 / dayHours);
    addShare(forcing.evaporation, forcing, whole, lasting(week.evaporation, index) / 1000 / 24);
    for (const interval of swim)
      addShare(forcing.swimmers, forcing, interval, once(week.swimmerHours, index) / swimHours);
    dim(forcing, whole, lasting(week.sky, index));
    for (const interval of pool.cover === 'none' ? [] : outside(whole, swim)) {
      addShare(forcing.covered, forcing, interval, 1);
      dim(forcing, interval, passes.sun);
    }
    if (once(week.backwash, index) > 0) {
      const { instant } = wallToInstant(dayOfEpochDay(day), '12:00', pool.timeZone);
      if (instant >= startsAt && instant < endsAt)
        forcing.backwashes.push({ at: instant, volume: Math.min(once(week.backwash, index), pool.volume) });
    }
  }
  const parts = partsOf(stepHours);
  for (let step = 0; step < steps; step++) {
    for (let part = step * parts; part < (step + 1) * parts; part++) forcing.sun[step]! += forcing.sunParts[part]!;
    forcing.sun[step]! /= parts;
    forcing.evaporation[step]! *= 1 - forcing.covered[step]! * (1 - passes.evaporation);
  }
  return forcing;
}

/** What a day brings where the last one named stands for those after it. */
function lasting(values: readonly number[], day: number): number {
  return values[day] ?? values.at(-1)!;
}

/** What a day brings where nothing named means nothing. */
function once(values: readonly number[], day: number): number {
  return values[day] ?? 0;
}

function hoursOf({ from, to }: InstantInterval): number {
  return (to - from) / MILLISECONDS_PER_HOUR;
}

/** Adds `value` to each step in proportion to its overlap with the interval. */
export function addShare(
  into: Float64Array,
  { startsAt, stepHours, steps }: Pick<Forcing, 'startsAt' | 'stepHours' | 'steps'>,
  interval: InstantInterval,
  value: number,
) {
  const length = stepHours * MILLISECONDS_PER_HOUR;
  const from = Math.max(0, (interval.from - startsAt) / length);
  const to = Math.min(steps, (interval.to - startsAt) / length);
  for (let step = Math.floor(from); step < to; step++)
    into[step]! += value * (Math.min(step + 1, to) - Math.max(step, from));
}

/** The parts of a whole interval in which none of `inner` (in order, not overlapping) runs. */
function outside(whole: InstantInterval, inner: readonly InstantInterval[]): InstantInterval[] {
  const gaps: InstantInterval[] = [];
  let from = whole.from;
  for (const interval of inner) {
    if (interval.from > from) gaps.push({ from, to: interval.from });
    from = Math.max(from, interval.to);
  }
  if (from < whole.to) gaps.push({ from, to: whole.to });
  return gaps;
}

/** Into how many parts a step is cut for the sun. */
function partsOf(stepHours: number): number {
  return Math.max(1, Math.round(SUN_SAMPLES_PER_HOUR * stepHours));
}

/** Mean of the sun between two instants [ms] inside the week. */
export function sunBetween(forcing: Forcing, from: number, to: number): number {
  const { sunParts, startsAt } = forcing;
  const length = partLength(forcing);
  const [first, last] = [(from - startsAt) / length, (to - startsAt) / length];
  let sum = 0;
  for (let part = Math.floor(first); part < last; part++)
    sum += sunParts[part]! * (Math.min(part + 1, last) - Math.max(part, first));
  return sum / (last - first);
}

/** Fills the sun's parts with the clear sky's UV at the middle of each, less what stands in the pool's sun. */
function shine(forcing: Forcing, { latitude, longitude, sunExposure }: Pool): void {
  const { sunParts, startsAt } = forcing;
  const length = partLength(forcing);
  const sines = sinesOfElevation(startsAt + length / 2, length, sunParts.length, latitude, longitude);
  for (let part = 0; part < sines.length; part++) sunParts[part] = sunExposure * ultravioletWeightOfSine(sines[part]!);
}

/** Lets a share of the sun through in the parts whose middle lies in the interval. */
function dim(forcing: Forcing, { from, to }: InstantInterval, share: number): void {
  const { sunParts, startsAt } = forcing;
  const length = partLength(forcing);
  const end = Math.min(sunParts.length, Math.ceil((to - startsAt) / length - 0.5));
  for (let part = Math.max(0, Math.ceil((from - startsAt) / length - 0.5)); part < end; part++)
    sunParts[part]! *= share;
}

/** Length of one of the sun's parts [ms]. */
function partLength({ sunParts, stepHours, steps }: Forcing): number {
  return (stepHours * steps * MILLISECONDS_PER_HOUR) / sunParts.length;
}
