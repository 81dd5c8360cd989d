'use client';

import { ReferenceLine } from 'recharts';
import type { ChartDose } from './chart-doses';
import type { ChartRow } from './chart-rows';
import { ChartWords } from './chart-words';
import { DoseCircles } from './dose-marks';
import { LaneChart, type LaneTime, layer } from './lane-chart';
import type { Reading } from './lane-cursor';
import { NotesLayer } from './notes-layer';
import { type Box, type Place, placeWords, type Words } from './place-words';
import { type ChartTest, TestMarks } from './test-marks';
import { isOn, xOf } from './time-axis';
import { type ValueAxis, yOf } from './value-axis';
import { type CurveQuantity, type Likely, waterAt, type WaterPoint } from './water-curve';
import { Curve, type Limit, LimitLines } from './water-lines';

export type QuantityLaneProps = {
  quantity: Exclude<CurveQuantity, 'freeChlorine'>;
  time: LaneTime;
  value: ValueAxis;
  rows: ChartRow[];
  points: readonly WaterPoint[];
  /** Where the quantity is kept. */
  keep: readonly number[];
  limits: readonly Limit[];
  doses: readonly ChartDose[];
  tests: readonly ChartTest[];
  phrases: { now: string | undefined; end: string | undefined; tests: Record<string, string> };
  label: string;
  reading: Reading<ChartRow>;
};

/** pH or stabilizer in a low lane of their own. */
export function QuantityLane(props: QuantityLaneProps) {
  const { quantity, time, value, rows, points, keep, limits, doses, tests, label } = props;
  const { axis, width } = time;
  const taken = takenBoxes(props);
  const words = placeWords(wordsOf(props), taken, { x: 0, y: 0, width, height: value.height });
  return (
    <LaneChart
      time={time}
      value={value}
      rows={rows}
      label={label}
      reading={props.reading}
      notes={
        <NotesLayer width={width} height={value.height}>
          <ChartWords words={words} />
          <DoseCircles axis={axis} width={width} value={value} doses={doses} points={points} quantity={quantity} />
        </NotesLayer>
      }
    >
      {keep.map((level) => (
        <ReferenceLine key={level} y={level} stroke="currentColor" strokeOpacity={0.6} zIndex={layer.limit} />
      ))}
      <LimitLines limits={limits} axis={value} />
      <Curve quantity={quantity} />
      <TestMarks tests={tests} radius={3.8} />
    </LaneChart>
  );
}

/** In a lane this low, words may stand on the likely range, but not on its middle, a limit or a test. */
function takenBoxes({ quantity, time: { axis, width }, value, points, limits, tests }: QuantityLaneProps): Box[] {
  const middles = points.slice(0, -1).flatMap((point, index) => {
    const next = points[index + 1];
    if (next === undefined) return [];
    const x = xOf(axis, width, point.at);
    const [here, there] = [yOf(value, point[quantity].middle), yOf(value, next[quantity].middle)];
    return [
      { x, y: Math.min(here, there) - 2, width: xOf(axis, width, next.at) - x, height: Math.abs(here - there) + 4 },
    ];
  });
  const hatches = limits.map((limit) => ({ x: 0, y: yOf(value, limit.value) - 7, width, height: 8 }));
  const dots = tests.map(({ at, value: level, spread, between }) => {
    const top = yOf(value, between?.high ?? level + spread);
    const bottom = yOf(value, between?.low ?? level - spread);
    return { x: xOf(axis, width, at) - 6, y: top, width: 12, height: bottom - top };
  });
  return [...middles, ...hatches, ...dots];
}

function wordsOf({ quantity, time: { axis, width, now }, value, points, tests, phrases }: QuantityLaneProps): Words[] {
  const line = (text: string) => [[{ text, size: 12.5, weight: 'bold' as const }]];
  const aboveAndBelow = (x: number, { low, middle, high }: Likely, anchor: Place['anchor']): Place[] =>
    [yOf(value, low) + 5, yOf(value, high) - 17, yOf(value, middle) + 4, yOf(value, middle) - 16].map((y) => ({
      x,
      y,
      anchor,
    }));
  const last = points.at(-1);
  const end = last &&
    phrases.end !== undefined && {
      id: 'end',
      lines: line(phrases.end),
      places: aboveAndBelow(xOf(axis, width, last.at) - 5, last[quantity], 'end'),
    };
  const level = isOn(axis, now) ? waterAt(points, now)?.[quantity] : undefined;
  const current = level &&
    phrases.now !== undefined && {
      id: 'now',
      lines: line(phrases.now),
      places: aboveAndBelow(xOf(axis, width, now) + 6, level, 'start'),
    };
  const measured = tests.flatMap(({ id, at, value: tested, spread, between }) => {
    const text = phrases.tests[id];
    if (text === undefined || !isOn(axis, at)) return [];
    const x = xOf(axis, width, at);
    const high = yOf(value, between?.high ?? tested + spread);
    const low = yOf(value, between?.low ?? tested - spread);
    const places: Place[] = [
      { x, y: high - 15, anchor: 'middle' },
      { x: x + 9, y: low - 2, anchor: 'start' },
      { x: x - 9, y: low - 2, anchor: 'end' },
      { x, y: low + 3, anchor: 'middle' },
    ];
    return [{ id: `test ${id}`, lines: line(text), places, mayBeLeftOut: true as const }];
  });
  return [...measured, ...(end ? [end] : []), ...(current ? [current] : [])].map((words) => ({
    ...words,
    mayBeLeftOut: true,
  }));
}
