'use client';

import { type ReactNode, useId } from 'react';
import { ComposedChart, ReferenceArea, ReferenceLine, XAxis, YAxis } from 'recharts';
import { LaneCursor, type Reading } from './lane-cursor';
import { isOn, type Stretch, type TimeAxis } from './time-axis';
import type { ValueAxis } from './value-axis';

/** What every lane of the sheet shares: one time axis, its nights, and where now stands. */
export type LaneTime = { axis: TimeAxis; width: number; nights: readonly Stretch[]; now: number; syncId: string };

type Props<Row> = {
  time: LaneTime;
  value: ValueAxis;
  rows: Row[];
  /** One sentence that says what the curve shows. */
  label: string;
  /** How the curve is read hour by hour. */
  reading: Reading<Row>;
  children: ReactNode;
  /** Words and marks over the chart. */
  notes?: ReactNode;
  /** Whether a finger reads along the curve: not where the lanes scroll sideways. */
  byFinger?: boolean;
};

/** Order of what lies over what; water at the bottom, marks on top. */
export const layer = {
  water: -20,
  night: -10,
  grid: -5,
  band: 100,
  limit: 150,
  curve: 400,
  now: 450,
  test: 600,
} as const;

/** Nothing grows or slides into place by itself. */
export const still = { isAnimationActive: false, activeDot: false, type: 'linear' } as const;

/**
 * A chart that fills its lane from edge to edge. Without margins an instant has the same x in every lane, and the plain
 * lanes between the charts can place theirs by the same share.
 */
export function LaneChart<Row extends { at: number }>(props: Props<Row>) {
  const { time, value, rows, label, reading, children, notes, byFinger = false } = props;
  const { axis, width, nights, now } = time;
  const sentence = useId();
  return (
    <div className="relative text-ink" style={{ width, height: value.height }}>
      <div id={sentence} role="img" aria-label={label}>
        <ComposedChart
          // The library loses its layers between two weeks, and with them nights and limits: each week has a chart of its own.
          key={`${axis.from} ${rows.length === 0}`}
          width={width}
          height={value.height}
          margin={{ top: 0, right: 0, bottom: 0, left: 0 }}
          data={rows}
          // The cursor over the chart is what a keyboard reaches.
          accessibilityLayer={false}
        >
          <XAxis type="number" dataKey="at" domain={[axis.from, axis.to]} hide allowDataOverflow />
          <YAxis type="number" domain={value.domain} hide allowDataOverflow width={0} />
          {nights.map(({ from, to }) => (
            <ReferenceArea
              key={from}
              x1={from}
              x2={to}
              className="text-night"
              fill="currentColor"
              fillOpacity={1}
              ifOverflow="hidden"
              zIndex={layer.night}
            />
          ))}
          {children}
          {isOn(axis, now) && <ReferenceLine x={now} stroke="currentColor" strokeWidth={1.6} zIndex={layer.now} />}
        </ComposedChart>
      </div>
      {notes}
      <LaneCursor {...{ time, value, rows, reading, byFinger }} describedBy={sentence} />
    </div>
  );
}
