import type { Point } from '@/lib/client/worked-out/examples/curve';

export type CurveCourse = { start: Point; end: Point; turn: Point | undefined };

/** So far beyond both ends a line has to go, as a share of what it spans, before its turn is worth saying. */
const WORTH_SAYING = 0.05;

/** Where a line begins and ends, and its farthest point beyond the two, if it has one. */
export function curveCourse(points: readonly Point[]): CurveCourse | undefined {
  const [start, end] = [points[0], points.at(-1)];
  if (start === undefined || end === undefined) return undefined;
  const heights = points.map(([, up]) => up);
  const span = Math.max(...heights) - Math.min(...heights);
  const [low, high] = [Math.min(start[1], end[1]), Math.max(start[1], end[1])];
  const beyond = ([, up]: Point) => Math.max(up - high, low - up);
  const farthest = points.reduce((best, point) => (beyond(point) > beyond(best) ? point : best), start);
  return { start, end, turn: span > 0 && beyond(farthest) > WORTH_SAYING * span ? farthest : undefined };
}
