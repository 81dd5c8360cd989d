import { describe, expect, it } from 'vitest';
import { chlorineWeekAxis } from '@/components/charts/lane-axes';
import { boxOf, placeWords } from '@/components/charts/place-words';
import { xOf } from '@/components/charts/time-axis';
import { yOf } from '@/components/charts/value-axis';
import { pointsOf, waterAt } from '@/components/charts/water-curve';
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

function geometry(nowHour: number, width: number): WeekGeometry {
  const points = pointsOf(aWeekSheet().ahead).filter(({ at }) => at >= axis.from && at <= axis.to);
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

describe('words of the chlorine lane', () => {
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
