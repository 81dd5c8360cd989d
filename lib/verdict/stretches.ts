import { limits } from '@/lib/standards/limits';
import type { SwimReason } from './codes';
import type { SwimVerdictInput } from './input';
import { rainBy, swimmerHoursByDay } from './load';
import { CLOCK_TOLERANCE, HOUR, outlookAt } from './outlook';
import { reasonsAt, STANDS_BESIDE_OUTLOOK, swimmerHoursLimit } from './reasons';

/** A stretch of time ahead in which the reasons stay the same. */
export type Stretch = { from: number; reasons: SwimReason[] };

/**
 * From now on, one stretch after the other. Between two turning points every value is a straight line, so the instants at
 * which a limit is met follow exactly; within a stretch one look in its middle tells the reasons of all of it.
 */
export function* stretchesAhead(input: SwimVerdictInput): Generator<Stretch> {
  const turns = turningPoints(input);
  for (const [index, turn] of turns.entries()) {
    const end = turns[index + 1];
    if (end === undefined) {
      // Behind the last turning point nothing changes any more.
      yield { from: turn, reasons: reasonsAt(input, turn + HOUR) };
      return;
    }
    const cuts = [turn, ...crossings(input, turn, end), end];
    for (const [cut, from] of cuts.slice(0, -1).entries())
      yield { from, reasons: reasonsAt(input, (from + (cuts[cut + 1] ?? end)) / 2) };
  }
}

/** Every instant at which a straight line may bend, jump, start or stop. */
function turningPoints({ now, readings, projection, waits, ahead }: SwimVerdictInput): number[] {
  const taken = [readings.freeChlorine, readings.pH].flatMap((reading) => (reading ? [reading.takenAt] : []));
  const points = [
    ...(projection?.hours ?? []),
    // From here on the outlook is read, a moment before its first hour.
    (projection?.hours[0] ?? now) - CLOCK_TOLERANCE,
    ...waits.flatMap(({ from, until }) => [from, until]),
    ...taken.flatMap((at) => [at + STANDS_BESIDE_OUTLOOK, at + limits.verdictReadingAge.value * HOUR]),
    ...[...(ahead?.rain ?? []), ...(ahead?.swimmerHours ?? [])].flatMap(({ from, until }) => [from, until]),
  ];
  const later = [...new Set(points)].filter((point) => point > now && point < Infinity);
  return [now, ...later.sort((a, b) => a - b)];
}

/** Where a value meets a limit strictly between two turning points. */
function crossings(input: SwimVerdictInput, from: number, to: number): number[] {
  const third = (to - from) / 3;
  const early = distances(input, from + third);
  const late = distances(input, to - third);
  const met = early.flatMap((distance, index) => {
    const slope = ((late[index] ?? Number.NaN) - distance) / third;
    const at = from + third - distance / slope;
    return at > from && at < to ? [at] : [];
  });
  return met.sort((a, b) => a - b);
}

/** How far each value lies from each limit it can meet; the sign turns where the limit is met. */
function distances(input: SwimVerdictInput, instant: number): number[] {
  const { codeMinimum } = input.limits;
  const maximum = limits.freeChlorineMaximum.value;
  const outlook = outlookAt(input, instant);
  const load = [
    rainBy(input, instant) - limits.rainEndsVerdict.value,
    // Each day by itself: the largest of several straight lines is none.
    ...swimmerHoursByDay(input, instant).map((swimmerHours) => swimmerHours - swimmerHoursLimit(input)),
  ];
  if (!outlook) return load;
  const { p10, p50, p90, lowestLevel, swimLimit, pH } = outlook;
  const pHLimits = [limits.pHLowest, limits.pHRangeLow, limits.pHRangeHigh, limits.pHHighest];
  return [
    ...load,
    p10 - codeMinimum,
    p90 - maximum,
    ...[codeMinimum, lowestLevel, swimLimit, maximum].map((limit) => p50 - limit),
    ...pHLimits.map((limit) => pH - limit.value),
  ];
}
