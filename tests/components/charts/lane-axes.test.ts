import { describe, expect, it } from 'vitest';
import { chlorineDayAxis, chlorineWeekAxis, pHAxis, stabilizerAxis } from '@/components/charts/lane-axes';
import { ticksOf, valueAxis, yOf } from '@/components/charts/value-axis';
import { pointsOf } from '@/components/charts/water-curve';
import { aWeekSheet } from '../../support/week-sheet';

const points = pointsOf(aWeekSheet().ahead);

describe('vertical axes', () => {
  it('put values between the room above and below', () => {
    const axis = valueAxis({ low: 0, high: 6, height: 268, above: 18, below: 8 });
    expect(yOf(axis, 6)).toBeCloseTo(18, 9);
    expect(yOf(axis, 0)).toBeCloseTo(260, 9);
    expect(yOf(axis, axis.domain[1])).toBeCloseTo(0, 9);
    expect(yOf(axis, axis.domain[0])).toBeCloseTo(268, 9);
    expect(ticksOf(axis, 36)).toEqual([0, 1, 2, 3, 4, 5, 6]);
  });

  it('go from 0 to 6 mg/L, and grow with a high limit, a high test or a wide range', () => {
    const top = (limit: number, measured: number[] = []) => chlorineWeekAxis(points, limit, measured, 268).high;
    expect(top(4)).toBe(6);
    expect(top(10)).toBe(15);
    expect(top(4, [9.1])).toBe(10);
    expect(chlorineWeekAxis([], 4, [], 268)).toMatchObject({ low: 0, high: 6 });
  });

  it('hold everything that is drawn', () => {
    const day = chlorineDayAxis(points.slice(0, 25), 4, [0.5], 208);
    expect(day.low).toBeLessThanOrEqual(0.5);
    expect(day.high).toBeGreaterThanOrEqual(5);
    expect(pHAxis(points, [6.8], 58)).toMatchObject({ low: 6.8, high: 7.9 });
    expect(stabilizerAxis(points, [30, 60], [88], 58)).toMatchObject({ low: 26, high: 88 });
  });
});
