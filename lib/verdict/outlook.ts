import type { SwimProjection, SwimVerdictInput } from './input';

export const HOUR = 3_600_000;
/** Instants may have been written in whole seconds, and clocks of two devices differ. */
export const CLOCK_TOLERANCE = 60_000;

/** The outlook at one instant [mg/L, pH]. */
export type Outlook = Record<'p10' | 'p50' | 'p90' | 'lowestLevel' | 'swimLimit' | 'pH', number>;

/**
 * The outlook at an instant, straight lines between the hours; undefined where there is none: outside the projection, when
 * a newer reading is not in it, or when a number in it is not finite. It is never extended.
 *
 * In an hour in which a dose goes in there is no straight line: before the dose the last hour holds, after it the next one.
 * A line would announce the chlorine before it is in the water.
 */
export function outlookAt(input: SwimVerdictInput, instant: number): Outlook | undefined {
  const { projection, readings, waits } = input;
  const start = projection?.hours[0];
  if (!projection || start === undefined) return undefined;
  const newest = Math.max(readings.freeChlorine?.takenAt ?? -Infinity, readings.pH?.takenAt ?? -Infinity);
  if (newest > start + CLOCK_TOLERANCE || instant < start - CLOCK_TOLERANCE) return undefined;

  const at = Math.max(instant, start);
  const index = projection.hours.findLastIndex((hour) => hour <= at);
  const from = projection.hours[index] ?? Number.NaN;
  const next = projection.hours[index + 1];
  if (next === undefined) return at === from ? finite(hourOf(projection, index)) : undefined;

  const dose = Math.min(...waits.map((wait) => wait.from).filter((dosed) => dosed > from && dosed <= next));
  const straight = (at - from) / (next - from);
  const share = dose === Infinity ? straight : at < dose ? 0 : 1;
  return finite(between(hourOf(projection, index), hourOf(projection, index + 1), share));
}

function hourOf({ freeChlorine, pH }: SwimProjection, index: number): Outlook {
  const value = (series: readonly number[]) => series[index] ?? Number.NaN;
  return {
    p10: value(freeChlorine.p10),
    p50: value(freeChlorine.p50),
    p90: value(freeChlorine.p90),
    lowestLevel: value(freeChlorine.lowestLevel),
    swimLimit: value(freeChlorine.swimLimit),
    pH: value(pH.p50),
  };
}

function between(start: Outlook, end: Outlook, share: number): Outlook {
  const mix = (key: keyof Outlook) => start[key] + share * (end[key] - start[key]);
  return {
    p10: mix('p10'),
    p50: mix('p50'),
    p90: mix('p90'),
    lowestLevel: mix('lowestLevel'),
    swimLimit: mix('swimLimit'),
    pH: mix('pH'),
  };
}

function finite(outlook: Outlook): Outlook | undefined {
  return Object.values(outlook).every(Number.isFinite) ? outlook : undefined;
}
