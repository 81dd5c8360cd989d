import { describe, expect, it } from 'vitest';
import { curveCourse } from '@/components/help/how/curve-course';

describe('the course of a drawn line', () => {
  it('is its two ends where it only falls', () => {
    expect(
      curveCourse([
        [0, 3],
        [1, 2],
        [2, 1],
      ]),
    ).toEqual({ start: [0, 3], end: [2, 1], turn: undefined });
  });

  it('has a turn where it goes well beyond them', () => {
    expect(
      curveCourse([
        [0, 0],
        [1, 8],
        [2, 1],
      ])?.turn,
    ).toEqual([1, 8]);
    expect(
      curveCourse([
        [0, 5],
        [1, -3],
        [2, 4],
      ])?.turn,
    ).toEqual([1, -3]);
  });

  it('has none for a ripple', () => {
    expect(
      curveCourse([
        [0, 0],
        [1, 10.2],
        [2, 10],
      ])?.turn,
    ).toBeUndefined();
  });

  it('has none where it is level, and is nothing without points', () => {
    expect(
      curveCourse([
        [0, 2],
        [1, 2],
        [2, 2],
      ])?.turn,
    ).toBeUndefined();
    expect(curveCourse([])).toBeUndefined();
  });
});
