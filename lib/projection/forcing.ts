import { addDays, dayOf, startOfDay } from '@/lib/calendar/household-day';
import { type InstantInterval, intervalsOfDay, wallToInstant } from '@/lib/calendar/wall-time';
import type { Pool } from '@/lib/schemas/pool';
import type { WeekAhead } from '@/lib/schemas/week-ahead';
import { solarElevations } from '@/lib/sun/elevation';
import { ultravioletWeight } from '@/lib/sun/ultraviolet';

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
  const sunThrough = sunUnder(pool, startsAt, endsAt, forcing.sunParts.length);

  let day = dayOf(startsAt, pool.timeZone);
  for (let index = 0; startOfDay(day, pool.timeZone) < endsAt; index++, day = addDays(day, 1)) {
    const whole = { from: startOfDay(day, pool.timeZone), to: startOfDay(addDays(day, 1), pool.timeZone) };
    const dayHours = (whole.to - whole.from) / MILLISECONDS_PER_HOUR;
    const swim = intervalsOfDay([pool.swimHours], day, pool.timeZone);
    const swimHours = swim.reduce((sum, { from, to }) => sum + (to - from) / MILLISECONDS_PER_HOUR, 0);
    const lasting = (values: readonly number[]) => values[index] ?? values.at(-1)!;
    const once = (values: readonly number[]) => values[index] ?? 0;
    const sky = lasting(week.sky);
    const evaporation = lasting(week.evaporation) / 1000 / 24;

    const running = intervalsOfDay(pool.pump, day, pool.timeZone);
    forcing.pumpIntervals.push(...running);
    for (const interval of running) addShare(forcing.pump, forcing, interval, 1);
    addShare(forcing.temperature, forcing, whole, week.waterTemperature ? lasting(week.waterTemperature) : temperature);
    addShare(forcing.rain, forcing, whole, once(week.rain) / 1000 / dayHours);
    for (const interval of swim) addShare(forcing.swimmers, forcing, interval, once(week.swimmerHours) / swimHours);
    for (const interval of pool.cover === 'none' ? [] : outside(whole, swim))
      addShare(forcing.covered, forcing, interval, 1);
    addShare(forcing.evaporation, forcing, whole, evaporation);
    addSky(forcing, whole, sky, sunThrough);
    if (once(week.backwash) > 0) {
      const { instant } = wallToInstant(day, '12:00', pool.timeZone);
      if (instant >= startsAt && instant < endsAt)
        forcing.backwashes.push({ at: instant, volume: Math.min(once(week.backwash), pool.volume) });
    }
  }
  const parts = partsOf(stepHours);
  forcing.sunParts.forEach((part, index) => (forcing.sun[Math.floor(index / parts)]! += part / parts));
  for (let step = 0; step < steps; step++) {
    const covered = forcing.covered[step]!;
    forcing.evaporation[step]! *= 1 - covered * (1 - passes.evaporation);
  }
  return forcing;
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
export function sunBetween({ sunParts, startsAt, stepHours, steps }: Forcing, from: number, to: number): number {
  const length = (stepHours * steps * MILLISECONDS_PER_HOUR) / sunParts.length;
  const [first, last] = [(from - startsAt) / length, (to - startsAt) / length];
  let sum = 0;
  for (let part = Math.floor(first); part < last; part++)
    sum += sunParts[part]! * (Math.min(part + 1, last) - Math.max(part, first));
  return sum / (last - first);
}

type SunSamples = { instants: number[]; weights: number[] };

function sunUnder(pool: Pool, startsAt: number, endsAt: number, samples: number): SunSamples {
  const spacing = (endsAt - startsAt) / samples;
  const instants = Array.from({ length: samples }, (_, sample) => startsAt + (sample + 0.5) * spacing);
  const swimming = new Map<string, readonly InstantInterval[]>();
  const through = (instant: number) => {
    if (pool.cover === 'none') return 1;
    const day = dayOf(instant, pool.timeZone);
    const intervals = swimming.get(day) ?? intervalsOfDay([pool.swimHours], day, pool.timeZone);
    swimming.set(day, intervals);
    const open = intervals.some(({ from, to }) => instant >= from && instant < to);
    return open ? 1 : coverPasses[pool.cover].sun;
  };
  const elevations = solarElevations(instants, pool.latitude, pool.longitude);
  const weights = instants.map(
    (instant, sample) => pool.sunExposure * ultravioletWeight(elevations[sample]!) * through(instant),
  );
  return { instants, weights };
}

function addSky({ sunParts }: Forcing, day: InstantInterval, sky: number, { instants, weights }: SunSamples) {
  instants.forEach((instant, sample) => {
    if (instant >= day.from && instant < day.to) sunParts[sample] = sky * weights[sample]!;
  });
}
