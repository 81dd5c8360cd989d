import type { SpreadAmount, SwimVerdictInput } from './input';

/** Rain since the reading and what is expected until an instant [mm]. */
export function rainBy({ now, sinceReading, ahead }: SwimVerdictInput, instant: number): number {
  const expected = (ahead?.rain ?? []).map((rain) => partOf(rain, now, instant));
  return sinceReading.rainMillimetres + expected.reduce((sum, millimetres) => sum + millimetres, 0);
}

/**
 * Swimmer-hours since the reading: on the busiest day so far, and on each expected day until an instant. What is expected
 * of a day counts from its beginning: by now those people have been in the water, whether or not somebody wrote it down.
 */
export function swimmerHoursByDay({ sinceReading, ahead }: SwimVerdictInput, instant: number): number[] {
  const expected = (ahead?.swimmerHours ?? []).map((day) => partOf(day, day.from, instant));
  return [sinceReading.swimmerHoursInADay, ...expected];
}

/** How much of an evenly spread amount falls between two instants. */
function partOf({ from, until, amount }: SpreadAmount, start: number, end: number): number {
  const overlap = Math.min(until, end) - Math.max(from, start);
  return overlap > 0 ? (amount * overlap) / (until - from) : 0;
}
