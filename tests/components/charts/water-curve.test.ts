import { describe, expect, it } from 'vitest';
import {
  courseOf,
  footOf,
  pointsOf,
  waterAt,
  type WaterPoint,
  wholeCourse,
  withJumps,
} from '@/components/charts/water-curve';
import { aWeekSheet } from '../../support/week-sheet';

const HOUR = 3_600_000;

function point(hour: number, level: number): WaterPoint {
  const likely = (middle: number) => ({ low: middle - 0.5, middle, high: middle + 0.5 });
  return {
    at: hour * HOUR,
    freeChlorine: likely(level),
    pH: likely(7.4),
    cyanuricAcid: likely(40),
    lowestLevel: 2,
    swimLimit: 4,
  };
}

const middles = (points: readonly WaterPoint[]) =>
  points.map(({ at, freeChlorine }) => [at / HOUR, freeChlorine.middle]);

describe('pointsOf', () => {
  it('keeps every hour of a reply with its own values', () => {
    const { ahead } = aWeekSheet();
    const points = pointsOf(ahead);
    expect(points).toHaveLength(169);
    expect(points.map(({ at }) => at)).toEqual(ahead!.hours.map((hour) => Date.parse(hour)));
    expect(points.map(({ freeChlorine }) => freeChlorine.high)).toEqual(ahead!.freeChlorine.p90);
    expect(points.map(({ cyanuricAcid }) => cyanuricAcid.low)).toEqual(ahead!.cyanuricAcid.p10);
  });

  it('leaves out an hour that lacks a value, rather than make one up', () => {
    const ahead = structuredClone(aWeekSheet().ahead)!;
    ahead.pH.p50 = ahead.pH.p50.slice(0, 100);
    expect(pointsOf(ahead)).toHaveLength(100);
    expect(pointsOf(null)).toEqual([]);
  });
});

describe('waterAt', () => {
  const points = [point(0, 3), point(1, 2)];
  it('reads between two hours and nowhere else', () => {
    expect(waterAt(points, HOUR / 4)?.freeChlorine.middle).toBeCloseTo(2.75, 12);
    expect(waterAt(points, HOUR)?.freeChlorine.middle).toBe(2);
    expect(waterAt(points, -1)).toBeUndefined();
    expect(waterAt(points, HOUR + 1)).toBeUndefined();
  });
});

describe('withJumps', () => {
  it('lets the curve rise at the dose and not in the hour before it', () => {
    const curve = withJumps([point(19, 2.5), point(20, 3.4), point(21, 3.3)], [19.75 * HOUR]);
    expect(middles(curve)).toEqual([
      [19, 2.5],
      [19.75, 2.5],
      [19.75, 3.4],
      [20, 3.4],
      [21, 3.3],
    ]);
    expect(waterAt(curve, 19.5 * HOUR)?.freeChlorine.middle).toBe(2.5);
    expect(waterAt(curve, 19.8 * HOUR)?.freeChlorine.middle).toBe(3.4);
    expect(footOf(curve, 19.75 * HOUR)?.freeChlorine.middle).toBe(2.5);
  });

  it('puts a dose of a full hour at the foot of that hour', () => {
    const curve = withJumps([point(19, 2.5), point(20, 3.4)], [20 * HOUR]);
    expect(middles(curve)).toEqual([
      [19, 2.5],
      [20, 2.5],
      [20, 3.4],
    ]);
  });

  it('leaves a curve alone that has no dose inside it', () => {
    const points = [point(0, 3), point(1, 2)];
    expect(withJumps(points, [-HOUR, 0, 5 * HOUR])).toEqual(points);
  });
});

describe('courseOf', () => {
  const axis = { from: 0, to: 10 * HOUR };
  const behind = [point(-2, 1), point(-1, 1.2), point(0, 1.4), point(1, 1.6), point(2, 1.8)];
  const ahead = [0, 1, 2, 3, 4, 5, 6, 7, 8, 9, 10, 11, 12].map((hour) => point(hour, 3 + hour / 10));

  it('holds to what was promised up to now and to the newest plan from now on', () => {
    const course = courseOf(behind, ahead, 2.5 * HOUR, axis);
    expect(middles(course.behind)).toEqual([
      [0, 1.4],
      [1, 1.6],
      [2, 1.8],
      [2.5, 3.25],
    ]);
    expect(middles(course.ahead)[0]).toEqual([2.5, 3.25]);
    expect(middles(course.ahead)[1]).toEqual([3, 3.3]);
    expect(course.ahead.at(-1)?.at).toBe(axis.to);
  });

  it('shows no hour twice as a whole', () => {
    const instants = wholeCourse(courseOf(behind, ahead, 2.5 * HOUR, axis)).map(({ at }) => at);
    expect(instants).toEqual([...new Set(instants)].toSorted((a, b) => a - b));
  });

  it('ends where the plan ends', () => {
    const course = courseOf(behind, ahead.slice(0, 6), 2.5 * HOUR, axis);
    expect(course.ahead.at(-1)?.at).toBe(5 * HOUR);
  });

  it('has nothing ahead without a plan, and nothing behind in a week to come', () => {
    expect(courseOf(behind, [], 2.5 * HOUR, axis).ahead).toEqual([]);
    expect(courseOf([], ahead, -5 * HOUR, axis).behind).toEqual([]);
    expect(courseOf([], ahead, -5 * HOUR, axis).ahead).toHaveLength(11);
  });
});
