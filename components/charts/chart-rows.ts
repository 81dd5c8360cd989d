import type { CurveQuantity, Likely, WaterCourse, WaterPoint } from './water-curve';

/** One instant of the chart. All three charts draw the same rows, so that a pointer in one finds its place in the others. */
export type ChartRow = { at: number; behind?: WaterPoint; ahead?: WaterPoint };

export function rowsOf({ behind, ahead }: WaterCourse): ChartRow[] {
  return [
    ...behind.map((point) => ({ at: point.at, behind: point })),
    ...ahead.map((point) => ({ at: point.at, ahead: point })),
  ];
}

export function waterOf(row: ChartRow): WaterPoint | undefined {
  return row.behind ?? row.ahead;
}

export type Side = 'behind' | 'ahead';

export function middleOf(side: Side, quantity: CurveQuantity) {
  return (row: ChartRow) => row[side]?.[quantity].middle;
}

export function bandOf(side: Side, quantity: CurveQuantity) {
  return (row: ChartRow) => ends(row[side]?.[quantity]);
}

function ends(likely: Likely | undefined): [number, number] | undefined {
  return likely && [likely.low, likely.high];
}
