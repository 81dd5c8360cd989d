import { parseInstant } from '@/lib/calendar/wall-time';
import type { Band } from '@/lib/schemas/plan';
import type { SheetCurve } from '@/lib/schemas/week-sheet';
import type { TimeAxis } from './time-axis';

/** 8 times in 10 the true value lies between `low` and `high`; `middle` is the value as likely too high as too low. */
export type Likely = { low: number; middle: number; high: number };

export type WaterPoint = {
  at: number;
  freeChlorine: Likely;
  lowestLevel: number;
  swimLimit: number;
  pH: Likely;
  cyanuricAcid: Likely;
};
export type CurveQuantity = 'freeChlorine' | 'pH' | 'cyanuricAcid';

/** The curve of a reply, point by point; a point that lacks a value is left out. */
export function pointsOf(curve: SheetCurve | null): WaterPoint[] {
  if (curve === null) return [];
  const { lowestLevel, swimLimit } = curve.freeChlorine;
  return curve.hours.flatMap((hour, index) => {
    const at = parseInstant(hour);
    const freeChlorine = likely(curve.freeChlorine, index);
    const pH = likely(curve.pH, index);
    const cyanuricAcid = likely(curve.cyanuricAcid, index);
    const low = lowestLevel[index];
    const limit = swimLimit[index];
    if (at === undefined || !freeChlorine || !pH || !cyanuricAcid || low === undefined || limit === undefined)
      return [];
    return [{ at, freeChlorine, pH, cyanuricAcid, lowestLevel: low, swimLimit: limit }];
  });
}

function likely({ p10, p50, p90 }: Band, index: number): Likely | undefined {
  const low = p10[index];
  const middle = p50[index];
  const high = p90[index];
  return low === undefined || middle === undefined || high === undefined ? undefined : { low, middle, high };
}

/** The water at an instant, between the two hours around it; undefined outside the curve. */
export function waterAt(points: readonly WaterPoint[], instant: number): WaterPoint | undefined {
  const index = points.findLastIndex(({ at }) => at <= instant);
  const before = points[index];
  const after = points[index + 1];
  if (before === undefined) return undefined;
  if (before.at === instant) return before;
  return after && between(before, after, instant);
}

/** What the plans of their time promised, up to now, and what the newest plan expects from now on. They meet at now. */
export type WaterCourse = { behind: WaterPoint[]; ahead: WaterPoint[] };

/**
 * Both curves of a sheet, cut at now and at the ends of an axis. The newest plan begins at its reading, so before now the
 * two overlap: what was promised at the time counts there, and the newest plan only closes the gap to now.
 */
export function courseOf(behind: WaterPoint[], ahead: WaterPoint[], now: number, axis: TimeAxis): WaterCourse {
  const promised = behind.filter(({ at }) => at < now);
  const promisedUntil = promised.at(-1)?.at ?? -Infinity;
  const sinceReading = ahead.filter(({ at }) => at > promisedUntil && at < now);
  const expectedNow = waterAt(ahead, now) ?? [];
  return {
    behind: cut([...promised, ...sinceReading, expectedNow].flat(), axis),
    ahead: cut([expectedNow, ...ahead.filter(({ at }) => at > now)].flat(), axis),
  };
}

/** The whole course in order, now counted once. */
export function wholeCourse({ behind, ahead }: WaterCourse): WaterPoint[] {
  const last = behind.at(-1);
  return [...behind, ...ahead.filter(({ at }) => last === undefined || at > last.at)];
}

function cut(points: WaterPoint[], { from, to }: TimeAxis): WaterPoint[] {
  const end = (at: number) => waterAt(points, at) ?? [];
  return [end(from), points.filter(({ at }) => at > from && at < to), end(to)].flat();
}

/**
 * The curve with each jump where it belongs. Values stand at full hours and already hold what was given up to then, so a
 * dose at 19:45 shows first at 20:00; a straight line from 19:00 would rise before anything was poured. Up to the dose the
 * hour before it holds, from then on the next one, as in the swim verdict.
 */
export function withJumps<Point extends { at: number }>(points: readonly Point[], doses: readonly number[]): Point[] {
  return points.flatMap((point, index) => {
    const before = points[index - 1];
    if (before === undefined) return [point];
    const poured = doses.filter((at) => at > before.at && at <= point.at);
    if (poured.length === 0) return [point];
    const at = Math.min(...poured);
    return [{ ...before, at }, ...(at < point.at ? [{ ...point, at }] : []), point];
  });
}

/** The foot of the jump that a dose makes: the water just before it. */
export function footOf(points: readonly WaterPoint[], doseAt: number): WaterPoint | undefined {
  return points.find(({ at }) => at === doseAt) ?? waterAt(points, doseAt);
}

function between(before: WaterPoint, after: WaterPoint, at: number): WaterPoint {
  const share = (at - before.at) / (after.at - before.at);
  const mix = (from: number, to: number) => from + (to - from) * share;
  const mixed = (from: Likely, to: Likely) => ({
    low: mix(from.low, to.low),
    middle: mix(from.middle, to.middle),
    high: mix(from.high, to.high),
  });
  return {
    at,
    freeChlorine: mixed(before.freeChlorine, after.freeChlorine),
    lowestLevel: mix(before.lowestLevel, after.lowestLevel),
    swimLimit: before.swimLimit,
    pH: mixed(before.pH, after.pH),
    cyanuricAcid: mixed(before.cyanuricAcid, after.cyanuricAcid),
  };
}
