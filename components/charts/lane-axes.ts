import { type ValueAxis, valueAxis } from './value-axis';
import type { WaterPoint } from './water-curve';

/** Room above the limit for the words that stand there: a gain of two lines, and the limit's own two. */
const ROOM_ABOVE_LIMIT = 1.5;

/** Free chlorine of a week, from 0: to 6, or as far up as limit, tests and likely range ask for. */
export function chlorineWeekAxis(
  points: readonly WaterPoint[],
  limit: number,
  measured: readonly number[],
  height: number,
): ValueAxis {
  const highest = Math.max(...points.map(({ freeChlorine }) => freeChlorine.high), ...measured, 0);
  return valueAxis({
    low: 0,
    high: Math.ceil(Math.max(6, limit * ROOM_ABOVE_LIMIT, highest + 0.2)),
    height,
    above: 18,
    below: 8,
  });
}

/** Free chlorine of one day on a phone: not from 0, so that a day's course can be seen. */
export function chlorineDayAxis(
  points: readonly WaterPoint[],
  limit: number,
  measured: readonly number[],
  height: number,
): ValueAxis {
  const values = points.flatMap(({ freeChlorine, lowestLevel }) => [freeChlorine.low, freeChlorine.high, lowestLevel]);
  return valueAxis({
    low: Math.max(0, Math.min(1.5, ...values.map((value) => value - 0.9), ...measured)),
    high: Math.max(limit + 1, ...values, ...measured),
    height,
    above: 8,
    below: 4,
  });
}

/** pH: 7.1 to 7.9, wider when the water is. */
export function pHAxis(points: readonly WaterPoint[], measured: readonly number[], height: number): ValueAxis {
  const values = [...points.flatMap(({ pH }) => [pH.low, pH.high]), ...measured];
  return valueAxis({ low: Math.min(7.1, ...values), high: Math.max(7.9, ...values), height, above: 7, below: 7 });
}

/** Stabilizer: the band it is kept in and 4 around it, wider when the water is. */
export function stabilizerAxis(
  points: readonly WaterPoint[],
  [low, high]: readonly [number, number],
  measured: readonly number[],
  height: number,
): ValueAxis {
  const values = [...points.flatMap(({ cyanuricAcid }) => [cyanuricAcid.low, cyanuricAcid.high]), ...measured];
  return valueAxis({
    low: Math.min(low - 4, ...values),
    high: Math.max(high + 4, ...values),
    height,
    above: 7,
    below: 7,
  });
}
