import { describe, expect, it } from 'vitest';
import { swipeOf } from '@/components/week-sheet/swipe';
import { isThisWeek, weeksBeside } from '@/components/week-sheet/weeks';

describe('the weeks beside a week', () => {
  it('have their first day in their address', () => {
    expect(weeksBeside('2026-07-06', '2026-07-08')).toEqual({
      previous: '/week?start=2026-06-29',
      next: '/week?start=2026-07-13',
    });
  });

  it.each([
    ['2026-06-29', 'next', '2026-07-06'],
    ['2026-06-29', 'next', '2026-07-12'],
    ['2026-07-13', 'previous', '2026-07-08'],
  ] as const)('from that of %s lead %s to the week of now on %s by its own address', (first, way, today) => {
    expect(weeksBeside(first, today)[way]).toBe('/week');
  });

  it('keep their days over a change of clocks', () => {
    expect(weeksBeside('2026-03-23', '2026-07-08').next).toBe('/week?start=2026-03-30');
  });
});

it('the week of now holds now, its first instant and not the one after its last', () => {
  const axis = { from: 100, to: 200 };
  expect([99, 100, 199, 200].map((now) => isThisWeek({ axis, now }))).toEqual([false, true, true, false]);
});

describe('a swipe', () => {
  const by = (x: number, y: number) => swipeOf({ x: 200, y: 300 }, { x: 200 + x, y: 300 + y });

  it.each([
    [-61, 0, 'next'],
    [61, 0, 'previous'],
    [-100, 50, 'next'],
    [100, -50, 'previous'],
  ])('of %i px across and %i down brings the %s week', (x, y, way) => {
    expect(by(x, y)).toBe(way);
  });

  it.each([
    ['too short', 60, 0],
    ['too steep', 100, 51],
    ['scrolling', 0, -300],
    ['scrolling aslant', -70, -200],
  ])('that is %s brings nothing', (_why, x, y) => {
    expect(by(x, y)).toBeUndefined();
  });
});
