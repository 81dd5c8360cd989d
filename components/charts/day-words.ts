import { type Place, type Run, type Weight, widthOf, type Words } from './place-words';
import { isOn, xOf } from './time-axis';
import { yOf } from './value-axis';
import { waterAt } from './water-curve';
import type { WeekGeometry, WeekPhrases } from './week-words';

const NOTE = 13.5;
const NOW = 27;
const HATCH = 9;

const run = (text: string, weight: Weight = 'plain', size = NOTE): Run => ({ text, size, weight });

/** What is written into one day's chart on a phone: less than into the week's, and larger. */
export function dayWords(phrases: WeekPhrases, geometry: WeekGeometry): Words[] {
  return [
    ...nowWords(phrases, geometry),
    limitWords(phrases, geometry),
    ...lowestWords(phrases, geometry),
    ...swimHoursWords(phrases, geometry),
    ...goodRangeWords(phrases, geometry),
  ];
}

function nowWords({ now: phrase }: WeekPhrases, { axis, width, value, points, now, limit }: WeekGeometry): Words[] {
  const water = waterAt(points, now)?.freeChlorine;
  if (phrase === undefined || water === undefined || !isOn(axis, now)) return [];
  const x = xOf(axis, width, now);
  const heights = [yOf(value, water.high) - NOW - 6, yOf(value, limit) - HATCH - NOW, yOf(value, water.low) + 8, 4];
  const places = heights.flatMap((y): Place[] => [
    { x: x - 10, y, anchor: 'end' },
    { x: x + 10, y, anchor: 'start' },
  ]);
  const line = [run(`${phrase.words} `, 'bold'), run(phrase.figure, 'figure', NOW)];
  return [{ id: 'now', lines: [line], places, ground: 'water', tone: 'teal' }];
}

function limitWords({ limitShort }: WeekPhrases, { width, value, limit }: WeekGeometry): Words {
  const y = yOf(value, limit) - HATCH - NOTE;
  const places: Place[] = [
    { x: 6, y, anchor: 'start' },
    { x: width - 6, y, anchor: 'end' },
    { x: 6, y: y - 16, anchor: 'start' },
    { x: width - 6, y: y - 16, anchor: 'end' },
  ];
  return { id: 'limit', lines: [[run(limitShort, 'bold')]], places };
}

function lowestWords(phrases: WeekPhrases, { axis, width, value, points, now }: WeekGeometry): Words[] {
  const level = (waterAt(points, now) ?? points[0])?.lowestLevel;
  if (level === undefined || !isOn(axis, now)) return [];
  const y = yOf(value, level) + HATCH + 2;
  const oneLine = [[run(phrases.lowest)]];
  const lines = widthOf(oneLine[0] ?? []) < width - 12 ? oneLine : phrases.lowestParts.map((part) => [run(part)]);
  return [{ id: 'lowest', lines, places: [y, y + 14].map((top) => ({ x: 6, y: top, anchor: 'start' })) }];
}

function swimHoursWords({ swimHoursShort }: WeekPhrases, { width, value, limit }: WeekGeometry): Words[] {
  const y = yOf(value, limit) + 12;
  const places = Array.from({ length: 8 }, (_, index): Place => ({ x: width - 6 - index * 26, y, anchor: 'end' }));
  const start: Place = { x: width * 0.82, y, anchor: 'end' };
  return [
    {
      id: 'swim hours',
      lines: [[run(swimHoursShort)]],
      places: [start, ...places],
      ground: 'water',
      mayBeLeftOut: true,
    },
  ];
}

function goodRangeWords({ goodRange }: WeekPhrases, { width, value, points, limit, now }: WeekGeometry): Words[] {
  const level = (waterAt(points, now) ?? points[0])?.lowestLevel;
  if (level === undefined) return [];
  const heights = [yOf(value, level) - 20, yOf(value, limit) + 12];
  const places = heights.flatMap((y): Place[] => [
    { x: 6, y, anchor: 'start' },
    { x: width - 6, y, anchor: 'end' },
    { x: width / 2, y, anchor: 'middle' },
  ]);
  return [{ id: 'good range', lines: [[run(goodRange, 'italic', 16)]], places, ground: 'water', mayBeLeftOut: true }];
}
