const HOUR = 3_600_000;

/** Where a cursor can stand: each instant of a curve once, in the order of time. */
export function stopsOf(rows: readonly { at: number }[]): number[] {
  return [...new Set(rows.map(({ at }) => at))].sort((a, b) => a - b);
}

/** The stop nearest to an instant, the earlier of two as near; -1 without any. */
export function nearestStop(stops: readonly number[], instant: number): number {
  return stops.reduce(
    (best, at, index) =>
      best === -1 || Math.abs(at - instant) < Math.abs((stops[best] ?? 0) - instant) ? index : best,
    -1,
  );
}

/**
 * What is said of a stop: at the instant of a dose a curve has its foot and its head, and the later one is the state after
 * the dose.
 */
export function rowAt<Row extends { at: number }>(rows: readonly Row[], at: number): Row | undefined {
  return rows.findLast((row) => row.at === at);
}

/** How far a key moves the cursor [h]; undefined for a key that does not. */
function hoursOf(key: string, shift: boolean): number | undefined {
  switch (key) {
    case 'ArrowRight':
    case 'ArrowUp':
      return shift ? 6 : 1;
    case 'ArrowLeft':
    case 'ArrowDown':
      return shift ? -6 : -1;
    case 'PageUp':
      return 24;
    case 'PageDown':
      return -24;
    default:
      return undefined;
  }
}

/**
 * The stop to which a key moves from another: an hour, six hours with Shift, a day, or the ends. Always to another one
 * where there is one that way, though the next hour may be nearer than the stops are apart. Undefined for any other key.
 */
export function stopAfterKey(
  stops: readonly number[],
  from: number,
  { key, shift }: { key: string; shift: boolean },
): number | undefined {
  const last = stops.length - 1;
  if (key === 'Home') return 0;
  if (key === 'End') return last;
  const hours = hoursOf(key, shift);
  const start = stops[from];
  if (hours === undefined || start === undefined) return undefined;
  const to = nearestStop(stops, start + hours * HOUR);
  return to === from ? Math.min(last, Math.max(0, from + Math.sign(hours))) : to;
}
