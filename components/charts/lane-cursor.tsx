'use client';

import { useMemo } from 'react';
import { nearestStop, rowAt, stopAfterKey, stopsOf } from './cursor-stops';
import { moveCursor, useCursor } from './cursor-store';
import { isOn, shareOf, type TimeAxis, xOf } from './time-axis';
import { type ValueAxis, yOf } from './value-axis';

export type Reading<Row> = {
  /** What is read: "Free chlorine, hour by hour". */
  name: string;
  /** What is said of one instant. */
  words: (row: Row) => string;
  /** Where the curve stands then. */
  level: (row: Row) => number | undefined;
};

type CursorTime = { axis: TimeAxis; width: number; now: number; syncId: string };

type Props<Row> = {
  time: CursorTime;
  value: ValueAxis;
  rows: readonly Row[];
  reading: Reading<Row>;
  /** The id of the sentence about the whole curve. */
  describedBy: string;
  /** On a page that does not scroll sideways a finger reads along the curve. */
  byFinger: boolean;
};

/** Over this a lane with a shorter curve says nothing of the hour that is read in another [ms]. */
const NEAR = 3_600_000;

/**
 * Reads a curve hour by hour, with the pointer or with keys, and draws the hour through its lane. For a screen reader it is
 * a slider over time, whose value it says at each step.
 */
export function LaneCursor<Row extends { at: number }>({
  time,
  value,
  rows,
  reading,
  describedBy,
  byFinger,
}: Props<Row>) {
  const { axis, now, syncId } = time;
  const stops = useMemo(() => stopsOf(rows), [rows]);
  const at = useCursor(syncId);
  const stop = nearestStop(stops, at !== undefined && isOn(axis, at) ? at : now);
  const stopAt = stops[stop];
  const row = stopAt === undefined ? undefined : rowAt(rows, stopAt);
  if (stopAt === undefined || row === undefined) return null;
  const go = (to: number | undefined) => moveCursor(syncId, to === undefined ? undefined : stops[to]);
  const readUnder = ({ currentTarget, clientX }: React.PointerEvent) => {
    const { left, width: across } = currentTarget.getBoundingClientRect();
    if (across > 0) go(nearestStop(stops, axis.from + ((clientX - left) / across) * (axis.to - axis.from)));
  };
  const shown = at !== undefined && Math.abs(stopAt - at) < NEAR;
  return (
    <>
      {shown && <CursorMark {...{ time, value, at: stopAt, level: reading.level(row), words: reading.words(row) }} />}
      <div
        role="slider"
        tabIndex={0}
        aria-label={reading.name}
        aria-describedby={describedBy}
        aria-orientation="horizontal"
        aria-valuemin={0}
        aria-valuemax={stops.length - 1}
        aria-valuenow={stop}
        aria-valuetext={reading.words(row)}
        className={`absolute inset-0 ${byFinger ? 'touch-pan-y touch-pinch-zoom' : ''}`}
        onFocus={() => {
          if (at === undefined) go(stop);
        }}
        onBlur={() => go(undefined)}
        onKeyDown={(event) => {
          if (event.altKey || event.ctrlKey || event.metaKey) return;
          if (event.key === 'Escape') {
            go(undefined);
            return;
          }
          const to = stopAfterKey(stops, stop, { key: event.key, shift: event.shiftKey });
          if (to === undefined) return;
          event.preventDefault();
          go(to);
        }}
        onPointerDown={readUnder}
        onPointerMove={readUnder}
        onPointerLeave={(event) => {
          // What is read by keys stays where it is.
          if (event.currentTarget !== document.activeElement) go(undefined);
        }}
      />
    </>
  );
}

type Mark = { time: CursorTime; value: ValueAxis; at: number; level: number | undefined; words: string };

/** The line of the hour, where the curve crosses it, and its words on the side that has more room. */
function CursorMark({ time: { axis, width }, value, at, level, words }: Mark) {
  const x = xOf(axis, width, at);
  const side = shareOf(axis, at) > 0.5 ? { right: width - x + 8 } : { left: x + 8 };
  return (
    <div aria-hidden="true" data-overlay="" className="pointer-events-none absolute inset-0">
      <svg width={width} height={value.height} className="absolute top-0 left-0 overflow-visible">
        <path d={`M${x} 0V${value.height}`} className="stroke-ink" strokeWidth="1" />
        {level !== undefined && (
          <circle cx={x} cy={yOf(value, level)} r="4" className="fill-ink stroke-paper-lift" strokeWidth="1.5" />
        )}
      </svg>
      <p className="absolute top-1 rounded bg-ink px-2 py-1 text-chart whitespace-nowrap text-on-ink" style={side}>
        {words}
      </p>
    </div>
  );
}
