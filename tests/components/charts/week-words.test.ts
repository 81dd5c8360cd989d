import { describe, expect, it } from 'vitest';
import { chlorineWeekAxis } from '@/components/charts/lane-axes';
import { type Box, boxOf, placeWords } from '@/components/charts/place-words';
import { xOf } from '@/components/charts/time-axis';
import { yOf } from '@/components/charts/value-axis';
import { pointsOf, waterAt, type WaterPoint } from '@/components/charts/water-curve';
import { takenBoxes, type WeekGeometry, type WeekPhrases, weekWords } from '@/components/charts/week-words';
import { aWeekSheet } from '../../support/week-sheet';

const HOUR = 3_600_000;
const axis = { from: Date.parse('2026-07-06T00:00:00+02:00'), to: Date.parse('2026-07-13T00:00:00+02:00') };
const phrases: WeekPhrases = {
  limit: [
    'Swim limit 4, from the label: no one swims above',
    'The bracket under it marks your swim hours, 10:00 to 20:00',
  ],
  limitShort: 'Swim limit 4',
  swimHoursShort: 'swim hours, 10:00 to 20:00',
  lowest: 'Lowest level 2.2: below it germs are killed too slowly',
  lowestParts: ['Lowest level 2.2:', 'below it germs are killed too slowly'],
  goodRange: 'good range',
  likely: ['Likely range: at any one hour, 8 times', 'in 10 the true value is in here'],
  now: { words: 'now, 10:20', figure: '3.1' },
  promised: 'Thin, before now: as promised at the time',
  planEnds: ['The plan ends here', 'the next test makes the next one'],
  meets: undefined,
  tests: {},
};

function geometry(nowHour: number, width: number, shift = 0, lowestLevel?: number): WeekGeometry {
  const points = pointsOf(aWeekSheet().ahead)
    .filter(({ at }) => at >= axis.from && at <= axis.to)
    .map((point) => moved(point, shift, lowestLevel));
  const doses = [19.67, 43.67, 91.67, 115.67, 139.67].map((hour, index) => ({
    id: `${index}`,
    at: axis.from + hour * HOUR,
    glyph: 'granules' as const,
    moves: 'freeChlorine' as const,
    given: false,
    gain: '+0.9',
    words: '95 g granules',
  }));
  const value = chlorineWeekAxis(points, 4, [], 268);
  const now = axis.from + nowHour * HOUR;
  return { axis, width, value, points, now, limit: 4, doses, tests: [], planEndsAt: points.at(-1)!.at };
}

/** The same water with so much more chlorine, at another stabilizer. */
function moved(point: WaterPoint, shift: number, lowestLevel = point.lowestLevel): WaterPoint {
  const { low, middle, high } = point.freeChlorine;
  const up = (level: number) => Math.max(0, level + shift);
  return { ...point, lowestLevel, freeChlorine: { low: up(low), middle: up(middle), high: up(high) } };
}

/** Where the curve first leaves its range after now, as the sheet finds it. */
function meetingIn({ points, now, limit }: WeekGeometry): WeekPhrases['meets'] {
  const met = points.find(
    ({ at, freeChlorine: { middle }, lowestLevel }) => at > now && (middle < lowestLevel || middle > limit),
  );
  if (met === undefined) return undefined;
  const low = met.freeChlorine.middle < met.lowestLevel;
  return {
    at: met.at,
    value: low ? met.lowestLevel : limit,
    words: low
      ? ['Wednesday night: meets the lowest level', 'check then, before anyone swims']
      : ['Saturday morning: over the swim limit', 'nobody swims while it is above'],
  };
}

type Placed = { id: string } & Box;

/** What lies over something else: two words, words over an edge, indispensable words on the curve. */
function faultsOf(shape: WeekGeometry, said: WeekPhrases): string[] {
  const bounds = { x: 0, y: 0, width: shape.width, height: shape.value.height };
  const placed = placeWords(weekWords(said, shape), takenBoxes(shape), bounds);
  const boxes: Placed[] = placed.map((words) => ({ id: words.id, ...boxOf(words.lines, words) }));
  const over = (a: Box, b: Box) =>
    a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height;
  const clashes = boxes.flatMap((a, index) =>
    boxes
      .slice(index + 1)
      .filter((b) => over(a, b))
      .map((b) => `${a.id} on ${b.id}`),
  );
  const outside = boxes
    .filter(
      ({ x, y, width, height }) => x < -0.01 || y < 0 || x + width > bounds.width + 0.01 || y + height > bounds.height,
    )
    .map(({ id }) => `${id} outside`);
  const middles = shape.points.map(({ at, freeChlorine }) => ({
    x: xOf(axis, shape.width, at),
    y: yOf(shape.value, freeChlorine.middle),
    ...{ width: 0.1, height: 0.1 },
  }));
  const struck = boxes.filter((box) => middles.some((point) => over(box, point))).map(({ id }) => `${id} on the curve`);
  return [...clashes, ...outside, ...struck];
}

describe('words of the chlorine lane', () => {
  it.each([740, 816, 910, 1390])('find room whatever the water, %i px wide', (width) => {
    for (const lowestLevel of [2, 2.6, 3.6])
      for (let shift = -2.4; shift < 1.3; shift += 0.6)
        for (let hour = 2; hour < 168; hour += 15) {
          const shape = geometry(hour, width, shift, lowestLevel);
          const faults = faultsOf(shape, { ...phrases, meets: meetingIn(shape) });
          expect(faults, `hour ${hour}, ${shift.toFixed(1)} more, lowest ${lowestLevel}`).toEqual([]);
        }
  });

  it.each([728, 910])('keep off each other and off the curve at every hour of the week, %i px wide', (width) => {
    for (let hour = 1; hour < 168; hour += 1) {
      const shape = geometry(hour, width);
      const bounds = { x: 0, y: 0, width, height: shape.value.height };
      const placed = placeWords(weekWords(phrases, shape), takenBoxes(shape), bounds);
      const boxes = placed.map((words) => ({ id: words.id, ...boxOf(words.lines, words) }));
      const clashes = boxes.flatMap((a, index) =>
        boxes
          .slice(index + 1)
          .filter((b) => a.x < b.x + b.width && b.x < a.x + a.width && a.y < b.y + b.height && b.y < a.y + a.height)
          .map((b) => `${hour}: ${a.id} on ${b.id}`),
      );
      expect(clashes).toEqual([]);
      expect(boxes.map(({ id }) => id)).toEqual(expect.arrayContaining(['now', 'limit', 'lowest']));
    }
  });

  it('stand above the limit or below the lowest level, the good range apart', () => {
    const shape = geometry(58, 910);
    const bounds = { x: 0, y: 0, width: 910, height: shape.value.height };
    const placed = placeWords(weekWords(phrases, shape), takenBoxes(shape), bounds);
    const limit = yOf(shape.value, 4);
    for (const words of placed.filter(({ id }) => !['good range', 'plan ends'].includes(id))) {
      const box = boxOf(words.lines, words);
      const lowest = Math.max(...shape.points.map(({ lowestLevel }) => lowestLevel));
      expect(box.y + box.height <= limit || box.y >= yOf(shape.value, lowest)).toBe(true);
    }
  });

  it('gives a dose its gain at its own hour', () => {
    const shape = geometry(58, 910);
    const words = weekWords(phrases, shape).find(({ id }) => id === 'gain 2')!;
    expect(words.lines.flat().map(({ text }) => text)).toEqual(['+0.9', '95 g granules']);
    expect(words.places[0]!.x).toBeCloseTo(xOf(axis, 910, shape.doses[2]!.at) - 3, 9);
    expect(waterAt(shape.points, shape.doses[2]!.at)).toBeDefined();
  });
});
