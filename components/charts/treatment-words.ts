import type { Box, Place, Run, Weight, Words } from './place-words';
import { isOn, type TimeAxis, xOf } from './time-axis';
import { type ValueAxis, yOf } from './value-axis';
import type { MorningBar, TreatmentDose, TreatmentPoint, TreatmentReading } from './treatment-rows';
import { treatmentFoot } from './treatment-rows';

/** What stands in the chart of a treatment, already in words of the page's language. */
export type TreatmentPhrases = {
  maximum: [bold: string, plain: string];
  limit: string;
  lowest: string;
  goodRange: string;
  now: string;
  /** Beside the first band: its name and its figures. */
  ordinary: [string, string] | undefined;
  /** Beside each reading, in their order. */
  readings: readonly string[];
};

export type TreatmentGeometry = {
  axis: TimeAxis;
  width: number;
  value: ValueAxis;
  now: number;
  points: readonly TreatmentPoint[];
  bars: readonly MorningBar[];
  readings: readonly TreatmentReading[];
  doses: readonly TreatmentDose[];
  maximum: number;
  swimLimit: number;
  lowestLevel: number;
};

/** Half the width of a band's bar [px]. */
export const BAR = 9;
const CHART = 12.5;
const LINE = CHART + 2.5;
/** Room that the hatch of a limit takes on its far side. */
const HATCH = 8;

const run = (text: string, weight: Weight = 'plain', size = CHART): Run => ({ text, size, weight });

/** The words of the chart, the indispensable first, each with the places where it may stand. */
export function treatmentWords(phrases: TreatmentPhrases, geometry: TreatmentGeometry): Words[] {
  return [
    ...nowWords(phrases, geometry),
    maximumWords(phrases, geometry),
    limitWords(phrases, geometry),
    lowestWords(phrases, geometry),
    ...readingWords(phrases, geometry),
    ...bandWords(phrases, geometry),
    ...goodRangeWords(phrases, geometry),
  ];
}

/** What no words may cover: the curve, the bands, the readings, the doses and the limits. */
export function treatmentBoxes(geometry: TreatmentGeometry): Box[] {
  const { axis, width, value, points, bars, readings, doses, maximum, swimLimit, lowestLevel } = geometry;
  const curve = points.slice(0, -1).flatMap((point, index) => {
    const next = points[index + 1];
    if (next === undefined) return [];
    const [top, bottom] = [Math.max(point.high, next.high), Math.min(point.low, next.low)];
    const x = xOf(axis, width, point.at);
    return [{ x, y: yOf(value, top), width: xOf(axis, width, next.at) - x, height: (top - bottom) * value.perUnit }];
  });
  const around = (at: number, top: number, bottom: number, half: number): Box => ({
    x: xOf(axis, width, at) - half,
    y: top,
    width: 2 * half,
    height: bottom - top,
  });
  const bands = bars.map(({ at, low, high }) => around(at, yOf(value, high), yOf(value, low), BAR + 1));
  const dots = readings.map(({ at, value: level }) => around(at, yOf(value, level) - 6, yOf(value, level) + 6, 6));
  const circles = doses.flatMap(({ at }) => {
    const foot = treatmentFoot(points, at);
    return foot === undefined ? [] : [around(at, yOf(value, foot) - 10, yOf(value, foot) + 10, 10)];
  });
  const lines = [maximum, swimLimit].map((limit) => ({ x: 0, y: yOf(value, limit) - HATCH + 1, width, height: HATCH }));
  const lowest = { x: 0, y: yOf(value, lowestLevel), width, height: HATCH - 1 };
  return [...curve, ...bands, ...dots, ...circles, ...lines, lowest];
}

function nowWords({ now: words }: TreatmentPhrases, { axis, width, now }: TreatmentGeometry): Words[] {
  if (!isOn(axis, now)) return [];
  const x = xOf(axis, width, now);
  const places: Place[] = [
    { x: x + 7, y: 4, anchor: 'start' },
    { x: x - 7, y: 4, anchor: 'end' },
  ];
  return [{ id: 'now', lines: [[run(words, 'bold')]], places }];
}

function maximumWords(
  { maximum: [bold, plain] }: TreatmentPhrases,
  { width, value, maximum }: TreatmentGeometry,
): Words {
  const y = yOf(value, maximum);
  return {
    id: 'maximum',
    lines: [[run(bold, 'bold')], [run(plain)]],
    places: [y + 5, y - HATCH - 2 * LINE].flatMap((top) => startsAt(top, width)),
  };
}

function limitWords({ limit }: TreatmentPhrases, { width, value, swimLimit }: TreatmentGeometry): Words {
  const y = yOf(value, swimLimit) - HATCH - CHART;
  return { id: 'limit', lines: [[run(limit)]], places: [y, y - LINE].flatMap((top) => startsAt(top, width)) };
}

function lowestWords({ lowest }: TreatmentPhrases, { width, value, lowestLevel }: TreatmentGeometry): Words {
  const y = yOf(value, lowestLevel) + HATCH + 2;
  const end: Place = { x: width - 8, y, anchor: 'end' };
  return { id: 'lowest', lines: [[run(lowest)]], places: [end, ...startsAt(y, width), ...startsAt(y + LINE, width)] };
}

function readingWords({ readings: words }: TreatmentPhrases, geometry: TreatmentGeometry): Words[] {
  const { axis, width, value, readings } = geometry;
  return readings.flatMap(({ at, value: level }, index) => {
    const text = words[index];
    if (text === undefined || !isOn(axis, at)) return [];
    const [x, y] = [xOf(axis, width, at), yOf(value, level)];
    const places = [y - 6, y - 20, y + 8, y - 36, y + 24, y - 52, y + 40].flatMap((top): Place[] => [
      { x: x + 12, y: top, anchor: 'start' },
      { x: x - 12, y: top, anchor: 'end' },
    ]);
    return [{ id: `reading ${at}`, lines: [[run(text, 'bold')]], places, mayBeLeftOut: true as const }];
  });
}

function bandWords({ ordinary }: TreatmentPhrases, { axis, width, value, bars }: TreatmentGeometry): Words[] {
  if (ordinary === undefined) return [];
  const lines = [[run(ordinary[0], 'bold')], [run(ordinary[1])]];
  const places = bars.flatMap(({ at, low, high }): Place[] => {
    const x = xOf(axis, width, at);
    return [yOf(value, high), yOf(value, low) - 2 * LINE, yOf(value, low) + 4].flatMap((y): Place[] => [
      { x: x + BAR + 6, y, anchor: 'start' },
      { x: x - BAR - 6, y, anchor: 'end' },
    ]);
  });
  return places.length === 0 ? [] : [{ id: 'ordinary', lines, places, mayBeLeftOut: true }];
}

function goodRangeWords({ goodRange }: TreatmentPhrases, geometry: TreatmentGeometry): Words[] {
  const { width, value, swimLimit, lowestLevel } = geometry;
  if (lowestLevel >= swimLimit) return [];
  const y = (yOf(value, swimLimit) + yOf(value, lowestLevel)) / 2 - 9;
  const places = Array.from({ length: 20 }, (_, index): Place => ({ x: width - 90 - index * 40, y, anchor: 'start' }));
  return [{ id: 'good range', lines: [[run(goodRange, 'italic', 16)]], places, ground: 'water', mayBeLeftOut: true }];
}

function startsAt(y: number, width: number): Place[] {
  return Array.from({ length: 24 }, (_, index): Place => ({ x: 10 + (index * width) / 24, y, anchor: 'start' }));
}
