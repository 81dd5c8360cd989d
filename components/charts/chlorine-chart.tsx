'use client';

import type { ReactNode } from 'react';
import { Area, ReferenceLine } from 'recharts';
import { type ChartRow, waterOf } from './chart-rows';
import { LaneChart, type LaneTime, layer, still } from './lane-chart';
import type { Reading } from './lane-cursor';
import { WAVES } from './patterns';
import { type ChartTest, TestMarks } from './test-marks';
import { ticksOf, type ValueAxis } from './value-axis';
import { Curve, type Limit, LimitLines, LowestLevelLine } from './water-lines';

type Props = {
  time: LaneTime;
  value: ValueAxis;
  rows: ChartRow[];
  limits: readonly Limit[];
  tests: readonly ChartTest[];
  label: string;
  reading: Reading<ChartRow>;
  notes: ReactNode;
  thicker?: number;
  byFinger?: boolean;
};

/** Free chlorine between the lowest level and the swim limit. */
export function ChlorineChart(props: Props) {
  const { time, value, rows, limits, tests, label, reading, notes, thicker = 0, byFinger = false } = props;
  return (
    <LaneChart {...{ time, value, rows, label, reading, notes, byFinger }}>
      {['water', 'waves'].map((fill) => (
        <Area
          key={fill}
          {...still}
          dataKey={goodRange}
          className="text-water-2"
          stroke="none"
          fill={fill === 'water' ? 'currentColor' : WAVES}
          fillOpacity={1}
          zIndex={layer.water}
        />
      ))}
      {ticksOf(value, 36).map((figure) => (
        <ReferenceLine key={figure} y={figure} className="text-rule" stroke="currentColor" zIndex={layer.grid} />
      ))}
      <LimitLines limits={limits} axis={value} />
      <LowestLevelLine axis={value} />
      <Curve quantity="freeChlorine" thicker={thicker} />
      <TestMarks tests={tests} />
    </LaneChart>
  );
}

function goodRange(row: ChartRow): [number, number] | undefined {
  const water = waterOf(row);
  return water && water.lowestLevel < water.swimLimit ? [water.lowestLevel, water.swimLimit] : undefined;
}
