import { type TimeAxis, xOf } from './time-axis';
import { waterAt, type WaterPoint } from './water-curve';

const HOUR = 3_600_000;
/** Where a leader leaves the words, from their left end [px]. */
const INSET = 14;

/** From words about the likely range, whose left end is at `x`, to the lower edge of the range three hours further on. */
export function leaderEnd(
  { axis, width, points }: { axis: TimeAxis; width: number; points: readonly WaterPoint[] },
  x: number,
): { fromX: number; toX: number; edge: number } | undefined {
  const fromX = x + INSET;
  const at = axis.from + (fromX / width) * (axis.to - axis.from) + 3 * HOUR;
  const edge = waterAt(points, at)?.freeChlorine.low;
  return edge === undefined ? undefined : { fromX, toX: xOf(axis, width, at), edge };
}
