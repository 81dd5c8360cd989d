import { hoursInDay, startOfDay } from '@/lib/calendar/household-day';
import { wallClock } from '@/lib/calendar/wall-time';
import { solarElevation } from '@/lib/sun/elevation';
import { ultravioletWeight } from '@/lib/sun/ultraviolet';

const QUARTER_HOUR = 900_000;

/** UV on a clear midsummer day: one share of the reference sun for each quarter of an hour of the wall clock, from 00:00. */
export type ClearDay = readonly number[];

/** Hours of the wall clock, 0 to 24. */
export type HourSpan = { from: number; to: number };

/**
 * A clear day in the middle of summer at a place, July in the north and January in the south. The year does not matter:
 * the sun stands the same.
 */
export function clearDay(latitude: number, longitude: number, timeZone: string): ClearDay {
  const day = latitude >= 0 ? '2026-07-10' : '2026-01-10';
  const start = startOfDay(day, timeZone);
  const weights = Array<number>(96).fill(0);
  for (let index = 0; index < hoursInDay(day, timeZone) * 4; index += 1) {
    const instant = start + (index + 0.5) * QUARTER_HOUR;
    const slot = Math.floor(wallClock(instant, timeZone).hourOfDay * 4);
    weights[slot] = ultravioletWeight(solarElevation(instant, latitude, longitude));
  }
  return weights;
}

/** The share of a clear day's UV that falls between two hours: what "sun from 9:30 to 18:30" means for the pool. */
export function exposureOf(day: ClearDay, { from, to }: HourSpan): number {
  const total = sum(day);
  if (total === 0) return 0;
  const share = sum(day.filter((_, index) => index / 4 >= from && index / 4 < to)) / total;
  return Math.min(1, Math.max(0, Math.round(share * 1000) / 1000));
}

/**
 * A span that gives an exposure, for a profile of which only the share is known: evenly from both ends of the sunlight, so
 * that it is centred where the sun is strongest.
 */
export function spanOf(day: ClearDay, exposure: number): HourSpan {
  const total = sum(day);
  if (total === 0) return { from: 8, to: 20 };
  const cut = (total * (1 - exposure)) / 2;
  return { from: hourWhere(day, cut), to: 24 - hourWhere([...day].reverse(), cut) };
}

/** Hours with any sun to speak of. */
export function sunlitHours(day: ClearDay): HourSpan {
  const first = day.findIndex((weight) => weight > 0);
  if (first === -1) return { from: 0, to: 24 };
  return { from: first / 4, to: (day.findLastIndex((weight) => weight > 0) + 1) / 4 };
}

function hourWhere(day: ClearDay, amount: number): number {
  let seen = 0;
  for (const [index, weight] of day.entries()) {
    seen += weight;
    if (seen > amount + 1e-9) return Math.floor(index / 2) / 2;
  }
  return 24;
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
