import type { CurveQuantity, WaterPoint } from './water-curve';

export type Moment = { at: number; value: number };

/** What there is to say of a curve in one sentence. */
export type CourseSummary = {
  start: Moment;
  lowest: Moment;
  highest: Moment;
  /** The first moment under the lower end of where the quantity belongs, or over its upper end. */
  below: Moment | undefined;
  above: Moment | undefined;
};

/** Between which levels a quantity belongs at a point. */
type Range = (point: WaterPoint) => readonly [low: number, high: number];

/** Free chlorine belongs between the lowest level, which moves with the stabilizer, and the swim limit. */
export const chlorineRange: Range = ({ lowestLevel, swimLimit }) => [lowestLevel, swimLimit];

/** The course of a quantity's middle over some points; undefined without any. Of two moments alike the earlier one counts. */
export function courseSummary(
  points: readonly WaterPoint[],
  quantity: CurveQuantity,
  range: Range,
): CourseSummary | undefined {
  const moments = points.map((point) => ({ at: point.at, value: point[quantity].middle, range: range(point) }));
  const [start] = moments;
  if (start === undefined) return undefined;
  const level = ({ at, value }: Moment): Moment => ({ at, value });
  const below = moments.find(({ value, range: [low] }) => value < low);
  const above = moments.find(({ value, range: [, high] }) => value > high);
  return {
    start: level(start),
    lowest: level(moments.reduce((best, moment) => (moment.value < best.value ? moment : best))),
    highest: level(moments.reduce((best, moment) => (moment.value > best.value ? moment : best))),
    // The limit that is met, not the value that meets it.
    below: below && { at: below.at, value: below.range[0] },
    above: above && { at: above.at, value: above.range[1] },
  };
}
