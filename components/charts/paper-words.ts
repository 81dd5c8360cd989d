import type { Place, Run, Weight, Words } from './place-words';
import { isOn, xOf } from './time-axis';
import { yOf } from './value-axis';
import type { WeekGeometry } from './week-words';

/** What stands in the chlorine lane on paper, already in words of the page's language. */
export type PaperPhrases = {
  limit: [bold: string, plain: string];
  lowest: string;
  likely: string;
  made: string;
  end: [bold: string, plain: string];
  tests: Record<string, string[]>;
};

const WORD = 11.5;
const GAIN = 15;
const GAP = 2.5;
const HATCH = 8;
const MARGIN = 3;

const run = (text: string, weight: Weight = 'plain', size = WORD): Run => ({ text, size, weight });

/** The words of the lane, the indispensable first. `endsAt`: where the page stops being good. */
export function paperWords(phrases: PaperPhrases, geometry: WeekGeometry, endsAt: number | undefined): Words[] {
  const { axis, width, value, limit, points, now, doses, tests } = geometry;
  const across = Array.from({ length: 24 }, (_, index) => 6 + (index * width) / 24);
  const above = yOf(value, limit) - HATCH - (2 * WORD + GAP);
  const bottom = value.height - WORD - MARGIN;
  const lowestAt = Math.min(...points.map(({ lowestLevel }) => lowestLevel), limit);
  const under = [8, 24, 40].map((drop) => yOf(value, lowestAt) + HATCH + drop);
  const rows = (tops: readonly number[]) => tops.flatMap((y) => across.map((x): Place => ({ x, y, anchor: 'start' })));
  const words: Words[] = [];
  if (endsAt !== undefined && isOn(axis, endsAt)) {
    const x = xOf(axis, width, endsAt);
    const places = [MARGIN, above, under[1] ?? 0].flatMap((y): Place[] => [
      { x: x + 6, y, anchor: 'start' },
      { x: x - 6, y, anchor: 'end' },
    ]);
    words.push({ id: 'end', lines: [[run(phrases.end[0], 'bold')], [run(phrases.end[1])]], places });
  }
  words.push({
    id: 'limit',
    lines: [[run(phrases.limit[0], 'bold')], [run(phrases.limit[1])]],
    places: rows([MARGIN, above]),
  });
  for (const { id, at, gain, moves } of doses) {
    if (gain === undefined || moves !== 'freeChlorine' || !isOn(axis, at)) continue;
    const x = xOf(axis, width, at);
    const y = yOf(value, limit) - HATCH - GAIN;
    const places: Place[] = [
      { x: x + 4, y, anchor: 'end' },
      { x: x + 4, y, anchor: 'start' },
    ];
    words.push({ id: `gain ${id}`, lines: [[run(gain, 'figure', GAIN)]], places, mayBeLeftOut: true });
  }
  if (points.length > 0) {
    words.push({ id: 'lowest', lines: [[run(phrases.lowest, 'bold')]], places: rows(under) });
    words.push({
      id: 'likely',
      lines: [[run(phrases.likely)]],
      places: [{ x: width - 4, y: bottom, anchor: 'end' }, ...rows([bottom, ...under])],
    });
  }
  if (isOn(axis, now)) {
    const x = xOf(axis, width, now);
    const places = [bottom, ...under].flatMap((y): Place[] => [
      { x: x + 5, y, anchor: 'start' },
      { x: x - 5, y, anchor: 'end' },
    ]);
    words.push({ id: 'made', lines: [[run(phrases.made, 'bold')]], places, mayBeLeftOut: true });
  }
  for (const { id, at, value: middle, spread } of tests) {
    const lines = (phrases.tests[id] ?? []).map((text) => [run(text)]);
    if (lines.length === 0 || !isOn(axis, at)) continue;
    const x = xOf(axis, width, at);
    const height = lines.length * (WORD + GAP);
    const tops = [yOf(value, middle + spread) - height - 6, yOf(value, middle - spread) + 8];
    const places = tops.flatMap((y): Place[] => [
      { x: x + 6, y, anchor: 'start' },
      { x: x - 6, y, anchor: 'end' },
    ]);
    words.push({ id: `test ${id}`, lines, places, mayBeLeftOut: true });
  }
  return words;
}
