'use client';

import { chlorineWeekAxis, pHAxis, stabilizerAxis } from '@/components/charts/lane-axes';
import type { ChartTest } from '@/components/charts/test-marks';
import type { ValueAxis } from '@/components/charts/value-axis';
import type { CurveQuantity } from '@/components/charts/water-curve';
import { chartTests } from './chart-input';
import { laneHeight } from './lane';
import { useSheet } from './sheet-context';

/** The vertical axes of the three charts, wide enough for curve and tests. */
export function useLaneAxes(): Record<CurveQuantity, ValueAxis> {
  const { sheet, picture } = useSheet();
  const { points } = picture;
  const measured = (quantity: CurveQuantity) => chartTests(sheet.readings, quantity).map(highestOf);
  return {
    freeChlorine: chlorineWeekAxis(points, sheet.pool.swimLimit, measured('freeChlorine'), laneHeight.chlorine),
    pH: pHAxis(points, measured('pH'), laneHeight.pH),
    cyanuricAcid: stabilizerAxis(points, sheet.pool.stabilizerBand, measured('cyanuricAcid'), laneHeight.stabilizer),
  };
}

function highestOf({ value, between }: ChartTest): number {
  return between?.high ?? value;
}
