import { zoneStretch } from './zone-offset';

/** No zone has ever been further from Greenwich than this [ms]; the farthest was Manila, 15 h 56 min, until 1844. */
const FARTHEST_OFFSET = 16 * 3_600_000;

/**
 * Every way to read a local time [ms]. Nearly always `earlier` and `later` are one instant. Of a time that comes twice
 * they are the first and the second. Of a time that the clocks skip they are what the clock would show had it changed
 * before or not yet, and `gap` is the moment of the change.
 */
export type LocalReading = { earlier: number; later: number; gap: number | undefined };

/**
 * When a zone's clocks show a local time: an addition in the stretch that holds it, two where clocks change nearby.
 *
 * @param local    the clock's day and time as if it stood in Greenwich [ms since 1970-01-01T00:00 on the clock]
 * @param timeZone IANA name
 * Range: zones change their clocks at most once in 32 hours. Errors: those of {@link zoneStretch}.
 */
export function readLocalTime(local: number, timeZone: string): LocalReading {
  const before = zoneStretch(local - FARTHEST_OFFSET, timeZone);
  const inBefore = local - before.offset;
  if (before.until > local + FARTHEST_OFFSET) return { earlier: inBefore, later: inBefore, gap: undefined };
  const after = zoneStretch(before.until, timeZone);
  const inAfter = local - after.offset;
  if (inBefore < before.until) {
    return { earlier: inBefore, later: inAfter < before.until ? inBefore : inAfter, gap: undefined };
  }
  if (inAfter >= before.until) return { earlier: inAfter, later: inAfter, gap: undefined };
  return { earlier: inAfter, later: inBefore, gap: before.until };
}
