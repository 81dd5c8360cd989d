import type { ChartDose } from './chart-doses';
import type { Box, Place, Run, Weight, Words } from './place-words';
import type { ChartTest } from './test-marks';
import { isOn, type TimeAxis, xOf } from './time-axis';
import { type ValueAxis, yOf } from './value-axis';
import { footOf, waterAt, type WaterPoint } from './water-curve';
import { leaderEnd } from './leader-end';

/** What stands in the chlorine lane, already in words of the page's language. */
export type WeekPhrases = {
  limit: [bold: string, plain: string];
  /** For a narrow page. */
  limitShort: string;
  swimHoursShort: string;
  lowest: string;
  /** The same in two lines for a narrow page. */
  lowestParts: [string, string];
  goodRange: string;
  likely: [string, string];
  now: { words: string; figure: string } | undefined;
  promised: string;
  planEnds: [string, string];
  meets: { at: number; value: number; words: [string, string] } | undefined;
  tests: Record<string, string[]>;
};

export type WeekGeometry = {
  axis: TimeAxis;
  width: number;
  value: ValueAxis;
  points: readonly WaterPoint[];
  now: number;
  limit: number;
  doses: readonly ChartDose[];
  tests: readonly ChartTest[];
  planEndsAt: number | undefined;
};

const CHART = 12.5;
const GAIN = 18;
const NOW = 25;
/** Room that the hatch of a limit takes on its far side. */
const HATCH = 8;
const SWIM_BRACKET = 8;
/** Room for the line from the words about the likely range up to it. */
const LEADER = { width: 44, height: 90 };
/** From one line of places to the next [px]. */
const LINE_STEP = 18;
/** Lines above the limit: the gains next to it, the limit's own words at the top. */
const TOP_MARGIN = 4;

const run = (text: string, weight: Weight = 'plain', size = CHART): Run => ({ text, size, weight });

/** The words of the chlorine lane, the indispensable first, each with the places where it may stand. */
export function weekWords(phrases: WeekPhrases, geometry: WeekGeometry): Words[] {
  return [
    ...nowWords(phrases, geometry),
    limitWords(phrases, geometry),
    ...gainWords(geometry),
    ...testWords(phrases, geometry),
    ...lowestWords(phrases, geometry),
    ...meetingWords(phrases, geometry),
    ...planEndWords(phrases, geometry),
    ...likelyWords(phrases, geometry),
    ...promisedWords(phrases, geometry),
    ...goodRangeWords(phrases, geometry),
  ];
}

/** What no words may cover: the likely range, hour by hour, the limits, and the marks of tests and doses. */
export function takenBoxes({ axis, width, value, points, limit, doses, tests }: WeekGeometry): Box[] {
  const band = points.slice(0, -1).flatMap((point, index) => {
    const next = points[index + 1];
    if (next === undefined) return [];
    const top = yOf(value, Math.max(point.freeChlorine.high, next.freeChlorine.high));
    const bottom = yOf(value, Math.min(point.freeChlorine.low, next.freeChlorine.low));
    const x = xOf(axis, width, point.at);
    return [{ x, y: top, width: xOf(axis, width, next.at) - x, height: bottom - top }];
  });
  const measured = tests.map(({ at, value: middle, spread, between }) => {
    const low = between?.low ?? middle - spread;
    const high = between?.high ?? middle + spread;
    return around(xOf(axis, width, at), yOf(value, high), yOf(value, low), 7);
  });
  const circles = doses.flatMap(({ at, moves }) => {
    const water = moves === 'freeChlorine' ? footOf(points, at) : undefined;
    if (water === undefined) return [];
    const y = yOf(value, water.freeChlorine.middle);
    return [around(xOf(axis, width, at), y - 10, y + 10, 10)];
  });
  const limitLine = { x: 0, y: yOf(value, limit) - HATCH + 1, width, height: HATCH + SWIM_BRACKET };
  const lowestLine = points.slice(0, -1).flatMap((point, index) => {
    const next = points[index + 1];
    if (next === undefined) return [];
    const x = xOf(axis, width, point.at);
    return [{ x, y: yOf(value, point.lowestLevel), width: xOf(axis, width, next.at) - x, height: HATCH - 1 }];
  });
  return [...band, ...measured, ...circles, limitLine, ...lowestLine];
}

function around(x: number, top: number, bottom: number, half: number): Box {
  return { x: x - half, y: top, width: 2 * half, height: bottom - top };
}

function nowWords({ now: phrase }: WeekPhrases, geometry: WeekGeometry): Words[] {
  const { axis, width, now } = geometry;
  if (phrase === undefined || !isOn(axis, now)) return [];
  const x = xOf(axis, width, now);
  const y = aboveLimit(geometry, NOW);
  const sides: Place[] = [
    { x: x - 9, y, anchor: 'end' },
    { x: x + 9, y, anchor: 'start' },
    { x: x - 9, y: TOP_MARGIN, anchor: 'end' },
    { x: x + 9, y: TOP_MARGIN, anchor: 'start' },
  ];
  return [
    {
      id: 'now',
      lines: [[run(`${phrase.words} `, 'bold'), run(phrase.figure, 'figure', NOW)]],
      places: sides,
      tone: 'teal',
    },
  ];
}

function gainWords(geometry: WeekGeometry): Words[] {
  const { axis, width, doses } = geometry;
  const y = aboveLimit(geometry, GAIN + CHART + 2.5);
  return doses.flatMap(({ id, at, gain, words, moves }) => {
    if (gain === undefined || moves !== 'freeChlorine' || !isOn(axis, at)) return [];
    const x = xOf(axis, width, at);
    const places: Place[] = [
      { x: x - 3, y, anchor: 'end' },
      { x: x + 4, y, anchor: 'start' },
      { x: x - 3, y: TOP_MARGIN, anchor: 'end' },
      { x: x + 4, y: TOP_MARGIN, anchor: 'start' },
    ];
    return [
      { id: `gain ${id}`, lines: [[run(gain, 'figure', GAIN)], [run(words)]], places, mayBeLeftOut: true as const },
    ];
  });
}

function testWords({ tests: phrases }: WeekPhrases, { axis, width, value, tests }: WeekGeometry): Words[] {
  return tests.flatMap(({ id, at, value: middle, spread, between }) => {
    const texts = phrases[id];
    if (texts === undefined || !isOn(axis, at)) return [];
    const x = xOf(axis, width, at);
    const top = yOf(value, between?.high ?? middle + spread);
    const bottom = yOf(value, between?.low ?? middle - spread);
    const height = texts.length * (CHART + 2.5);
    const beside = [bottom - height, top, bottom, bottom + 24].flatMap((y): Place[] => [
      { x: x + 10, y, anchor: 'start' },
      { x: x - 10, y, anchor: 'end' },
    ]);
    const under: Place = { x: x - 4, y: bottom + 14, anchor: 'middle' };
    const over: Place = { x, y: top - height - 4, anchor: 'middle' };
    const lines = texts.map((text) => [run(text, 'bold')]);
    const places = between ? [...beside, under, over] : [under, over, ...beside];
    return [{ id: `test ${id}`, lines, places, mayBeLeftOut: true as const }];
  });
}

function limitWords({ limit: [bold, plain], limitShort }: WeekPhrases, geometry: WeekGeometry): Words {
  const lines = [[run(bold, 'bold')], [run(plain)]];
  const low = aboveLimit(geometry, 2 * CHART + 2.5);
  const across = [...everyQuarter(geometry.width), 10];
  const places = [TOP_MARGIN, low].flatMap((y) => across.map((x): Place => ({ x, y, anchor: 'start' })));
  const shorter = [[[run(bold, 'bold')]], [[run(limitShort, 'bold')]]];
  return { id: 'limit', lines, shorter, places: [{ x: 10, y: TOP_MARGIN, anchor: 'start' }, ...places] };
}

function lowestWords({ lowest, lowestParts }: WeekPhrases, geometry: WeekGeometry): Words[] {
  const { axis, width, value, points, now } = geometry;
  const from = points[0];
  if (from === undefined) return [];
  const start = xOf(axis, width, Math.min(Math.max(now, axis.from), axis.to)) - 100;
  const across = [start, xOf(axis, width, from.at) + 10, ...everyQuarter(width)];
  const reach = yOf(value, from.lowestLevel) + HATCH;
  const drops = Array.from({ length: Math.ceil((value.height - reach) / LINE_STEP) }, (_, row) => 4 + row * LINE_STEP);
  const below = (x: number, drop: number): Place => {
    const at = axis.from + (x / width) * (axis.to - axis.from);
    const level = (waterAt(points, at) ?? from).lowestLevel;
    return { x, y: yOf(value, level) + HATCH + drop, anchor: 'start' };
  };
  // Near the line where there is room; the curve may itself be down there.
  const places = drops.flatMap((drop) => across.map((x) => below(x, drop)));
  return [{ id: 'lowest', lines: [[run(lowest)]], shorter: [lowestParts.map((part) => [run(part)])], places }];
}

function meetingWords({ meets }: WeekPhrases, geometry: WeekGeometry): Words[] {
  const { axis, width, value, points } = geometry;
  if (meets === undefined) return [];
  const x = xOf(axis, width, meets.at);
  const y = yOf(value, meets.value);
  const high = 2 * CHART + 2.5;
  const aside = [8, 40, 80, 130, 190, 250, 310];
  // Under the lowest level or over the limit, the side of the meeting first; between the two only where nothing else is free.
  const level = waterAt(points, meets.at)?.lowestLevel ?? 0;
  const under = [14, 32, 50, 68, 86, 104].map((drop) => yOf(value, level) + drop);
  const over = [aboveLimit(geometry, high), TOP_MARGIN];
  const tops = meets.value > level ? [...over, ...under, y + 14] : [...under, ...over, y - 44];
  const places = tops.flatMap((top) =>
    aside.flatMap((gap): Place[] => [
      { x: x + gap, y: top, anchor: 'start' },
      { x: x - gap, y: top, anchor: 'end' },
    ]),
  );
  return [{ id: 'meets', lines: [[run(meets.words[0], 'bold')], [run(meets.words[1])]], places }];
}

function planEndWords({ planEnds }: WeekPhrases, { axis, width, value, planEndsAt }: WeekGeometry): Words[] {
  if (planEndsAt === undefined || planEndsAt >= axis.to || planEndsAt < axis.from) return [];
  const x = xOf(axis, width, planEndsAt);
  const rows = Array.from({ length: Math.floor(value.height / LINE_STEP) }, (_, row) => TOP_MARGIN + row * LINE_STEP);
  const heights = [value.height * 0.45, value.height * 0.72, value.height * 0.85, TOP_MARGIN, ...rows];
  const places = [8, 60, 120].flatMap((gap) =>
    heights.flatMap((y): Place[] => [
      { x: x + gap, y, anchor: 'start' },
      { x: x - gap, y, anchor: 'end' },
      { x: width - 6, y, anchor: 'end' },
    ]),
  );
  const bold = [run(planEnds[0], 'bold')];
  return [{ id: 'plan ends', lines: [bold, [run(planEnds[1])]], shorter: [[bold]], places }];
}

function likelyWords({ likely }: WeekPhrases, { axis, width, value, points }: WeekGeometry): Words[] {
  const lines = likely.map((text) => [run(text)]);
  const y = yOf(value, 0.6) - 2 * CHART;
  // Only under the curve: the leader has to end at it.
  const underCurve = (x: number) => leaderEnd({ axis, width, points }, x) !== undefined;
  const places = [width * 0.58, ...everyQuarter(width).reverse()]
    .filter(underCurve)
    .map((x): Place => ({ x, y, anchor: 'start' }));
  return places.length === 0 ? [] : [{ id: 'likely', lines, places, leader: LEADER, mayBeLeftOut: true }];
}

function promisedWords({ promised }: WeekPhrases, { axis, width, value, points, now }: WeekGeometry): Words[] {
  const first = points[0];
  if (first === undefined || now <= first.at || !isOn(axis, now)) return [];
  const y = yOf(value, 0.3) - CHART;
  const places: Place[] = [
    { x: 10, y, anchor: 'start' },
    { x: xOf(axis, width, now) - 9, y, anchor: 'end' },
  ];
  return [{ id: 'promised', lines: [[run(promised)]], places, mayBeLeftOut: true }];
}

function goodRangeWords({ goodRange }: WeekPhrases, geometry: WeekGeometry): Words[] {
  const { axis, width, value, points, limit, now } = geometry;
  const lines = [[run(goodRange, 'italic', 16)]];
  const within = (x: number): Place[] => {
    const lowest = waterAt(points, axis.from + (x / width) * (axis.to - axis.from))?.lowestLevel;
    if (lowest === undefined) return [];
    return [yOf(value, limit) + 12, yOf(value, lowest) - 20].map((y) => ({ x, y, anchor: 'middle' }));
  };
  const after = xOf(axis, width, Math.max(now, axis.from));
  const across = Array.from({ length: 28 }, (_, index) => (after + 110 + index * 34) % width);
  return [{ id: 'good range', lines, places: across.flatMap(within), ground: 'water', mayBeLeftOut: true }];
}

function aboveLimit({ value, limit }: WeekGeometry, height: number): number {
  return yOf(value, limit) - HATCH - height;
}

function everyQuarter(width: number): number[] {
  return Array.from({ length: 28 }, (_, index) => 10 + (index * width) / 28);
}
