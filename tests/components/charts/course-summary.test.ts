import { describe, expect, it } from 'vitest';
import { chlorineRange, courseSummary } from '@/components/charts/course-summary';
import type { WaterPoint } from '@/components/charts/water-curve';

const likely = (middle: number) => ({ low: middle - 0.3, middle, high: middle + 0.3 });
const course = (levels: readonly number[], lowestLevel = 2.2): WaterPoint[] =>
  levels.map((level, hour) => ({
    at: hour,
    freeChlorine: likely(level),
    lowestLevel,
    swimLimit: 4,
    pH: likely(7.5),
    cyanuricAcid: likely(44),
  }));
const summary = (levels: readonly number[]) => courseSummary(course(levels), 'freeChlorine', chlorineRange);

describe('what there is to say of a curve', () => {
  it('is where it starts, how far it goes down and up, and when', () => {
    expect(summary([3, 2.7, 2.5, 3.4, 3.1])).toEqual({
      start: { at: 0, value: 3 },
      lowest: { at: 2, value: 2.5 },
      highest: { at: 3, value: 3.4 },
      below: undefined,
      above: undefined,
    });
  });

  it('is the first hour of two alike', () => {
    expect(summary([3, 2.5, 2.5, 3])).toMatchObject({ lowest: { at: 1 }, highest: { at: 0 } });
  });

  it('names the limit that is met, and first met', () => {
    expect(summary([3, 2.1, 1.9, 4.2, 4.4])).toMatchObject({
      below: { at: 1, value: 2.2 },
      above: { at: 3, value: 4 },
    });
  });

  it('takes a value on a limit for inside', () => {
    expect(summary([4, 2.2])).toMatchObject({ below: undefined, above: undefined });
  });

  it('is nothing of no curve', () => {
    expect(courseSummary([], 'pH', () => [7.2, 7.8])).toBeUndefined();
  });
});
