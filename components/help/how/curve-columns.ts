import type { Curve, Point } from '@/lib/client/worked-out/examples/curve';
import type { FigureName } from '@/lib/client/worked-out/examples/names';

/** One column of a curve's table: a line, or one edge of a range. */
export type CurveColumn = { name: FigureName; edge?: 'from' | 'to'; valueAt: (row: number) => number | undefined };

/**
 * Everything that a drawn example shows, column by column: its lines, both edges of its ranges, and what took chlorine
 * in each hour. A name that two lines share stands for a range that is drawn by its edges, the lower one first.
 */
export function curveColumns({ lines, ranges = [], taken }: Curve, places: readonly number[]): CurveColumn[] {
  const along = (points: readonly Point[]) => (row: number) => nearest(points, places[row] ?? 0)?.[1];
  const ofLines = lines.map(({ name, points }, index): CurveColumn => {
    const first = lines.findIndex((line) => line.name === name);
    const alone = lines.filter((line) => line.name === name).length === 1;
    return { name, ...(alone ? {} : { edge: index === first ? 'from' : 'to' }), valueAt: along(points) };
  });
  const ofRanges = ranges.flatMap(({ name, low, high }): CurveColumn[] => [
    { name, edge: 'from', valueAt: along(low) },
    { name, edge: 'to', valueAt: along(high) },
  ]);
  const ofTaken = (taken?.[0]?.parts ?? []).map(({ name }, part): CurveColumn => ({
    name,
    valueAt: (row) => taken?.find(({ at }) => at === places[row])?.parts[part]?.value,
  }));
  return [...ofLines, ...ofRanges, ...ofTaken];
}

function nearest(points: readonly Point[], place: number): Point | undefined {
  const off = ([across]: Point) => Math.abs(across - place);
  return points.reduce<Point | undefined>((best, point) => (best && off(best) <= off(point) ? best : point), undefined);
}
