import { describe, expect, it } from 'vitest';
import { LEVEL_STEP, triedLevels, triedPath } from '@/components/charts/tried-levels';

const HOUR = 3_600_000;
const at = [0, 1, 2, 3, 4].map((hour) => hour * HOUR);
const plan = { at, levels: [3, 2.9, 2.8, 3.7, 3.6], jumps: [2.75 * HOUR] };

describe('the levels of a tried week', () => {
  it('jump where a dose goes in, not over the hour before it', () => {
    const { plan: levels, from } = triedLevels(plan, plan, 2 * HOUR);
    expect(from).toBe(2 * HOUR);
    expect(levels.slice(0, 5)).toEqual([2.8, 2.8, 2.8, 3.7, 3.7]);
  });

  it('run straight between hours without a dose', () => {
    const { plan: levels } = triedLevels(plan, plan, 0);
    expect(levels.slice(0, 5)).toEqual([3, 2.975, 2.95, 2.925, 2.9].map((level) => expect.closeTo(level, 9)));
  });

  it('differ from the hour on from which they can be told apart', () => {
    const tried = { ...plan, levels: [3, 2.9, 2.4, 3.3, 3.2] };
    const levels = triedLevels(plan, tried, 0);
    // An hour and a quarter: 0.1 of the 0.4 by which the second hour is lower.
    expect(levels.differsAt).toBe(5);
    expect(triedLevels(plan, plan, 0).differsAt).toBeUndefined();
  });

  it('are drawn from just before that on, and only on the axis', () => {
    const tried = { ...plan, levels: [3, 2.9, 2.4, 3.3, 3.2] };
    const levels = triedLevels(plan, tried, 0);
    const place = {
      axis: { from: 0, to: 2 * HOUR },
      x: (instant: number) => instant / LEVEL_STEP,
      y: (level: number) => level,
    };
    const path = triedPath(levels, levels.tried, place);
    expect(path.startsWith('M4 2.9L5 ')).toBe(true);
    expect(path.endsWith('L8 2.4')).toBe(true);
  });
});
