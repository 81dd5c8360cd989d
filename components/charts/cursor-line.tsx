'use client';

import { useCursor } from './cursor-store';
import { isOn, shareOf, type TimeAxis } from './time-axis';

/** The hour that is read in a chart, drawn behind the lanes beside it. */
export function CursorLine({ axis, syncId, height }: { axis: TimeAxis; syncId: string; height?: number }) {
  const at = useCursor(syncId);
  if (at === undefined || !isOn(axis, at)) return null;
  return (
    <div
      aria-hidden="true"
      data-cursor-line=""
      className="pointer-events-none absolute top-0 h-full border-l border-ink"
      style={{ left: `calc(${shareOf(axis, at) * 100}% - 0.5px)`, ...(height === undefined ? {} : { height }) }}
    />
  );
}
