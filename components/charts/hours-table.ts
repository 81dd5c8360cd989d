import type { Side } from './chart-rows';
import type { CurveQuantity, Likely, WaterPoint } from './water-curve';

/** One hour of a curve as the table shows it. */
export type HourRow = { at: number; side: Side; likely: Likely; lowestLevel: number; swimLimit: number };

/**
 * The hours of a curve for its table: the very points the chart draws, without those that only shape a jump and without
 * the one put in at now.
 */
export function hourRows(
  points: readonly WaterPoint[],
  quantity: CurveQuantity,
  now: number,
  hours: ReadonlySet<number>,
): HourRow[] {
  const ofHours = points.filter(({ at }) => hours.has(at));
  // At the instant of a dose the curve has its foot and its head; the later one is the state after the dose.
  const last = ofHours.filter(({ at }, index) => ofHours[index + 1]?.at !== at);
  return last.map((point) => ({
    at: point.at,
    side: point.at < now ? 'behind' : 'ahead',
    likely: point[quantity],
    lowestLevel: point.lowestLevel,
    swimLimit: point.swimLimit,
  }));
}
