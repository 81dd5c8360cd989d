import { type TimeAxis, xOf } from './time-axis';
import { type ValueAxis, yOf } from './value-axis';

/** Where a chart on paper lies: one lane of a fixed width [px]. */
export type PaperGround = { axis: TimeAxis; width: number; value: ValueAxis };

/** A line through the points of a curve as the d of a path; empty without points. */
export function linePath<Point extends { at: number }>(
  points: readonly Point[],
  level: (point: Point) => number,
  ground: PaperGround,
): string {
  const corners = points.map((point) => corner(point.at, level(point), ground));
  return corners.length === 0 ? '' : `M${corners.join('L')}`;
}

/** The area between two levels of a curve: along the upper one and back along the lower. */
export function areaPath<Point extends { at: number }>(
  points: readonly Point[],
  { low, high }: { low: (point: Point) => number; high: (point: Point) => number },
  ground: PaperGround,
): string {
  const there = points.map((point) => corner(point.at, high(point), ground));
  const back = points.map((point) => corner(point.at, low(point), ground)).reverse();
  return there.length === 0 ? '' : `M${[...there, ...back].join('L')}Z`;
}

function corner(at: number, level: number, { axis, width, value }: PaperGround): string {
  return `${tenth(xOf(axis, width, at))} ${tenth(yOf(value, level))}`;
}

/** A printer draws no finer. */
function tenth(pixels: number): number {
  return Math.round(pixels * 10) / 10;
}
