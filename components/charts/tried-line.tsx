'use client';

import { useEffect, useRef } from 'react';
import { MeetingMark } from './dose-marks';
import { NotesLayer } from './notes-layer';
import { isOn, type TimeAxis, xOf } from './time-axis';
import { type TriedLevels, triedPath } from './tried-levels';
import { type ValueAxis, yOf } from './value-axis';

/** As the visual language has it. */
const MORPH = 240;

type Props = {
  axis: TimeAxis;
  width: number;
  value: ValueAxis;
  levels: TriedLevels;
  /** Where it meets a limit that the plan keeps. */
  meets: { at: number; level: number } | undefined;
  /** Called in the frame in which a new line is first seen. */
  onPainted: () => void;
};

/**
 * The second line of free chlorine: the week as it is tried. It lies over the chart, which is not drawn again, and moves
 * from line to line by itself, without React, so that it follows every key press.
 */
export function TriedLine({ axis, width, value, levels, meets, onPainted }: Props) {
  const path = useRef<SVGPathElement>(null);
  const shown = useRef<{ from: number; levels: readonly number[] }>(undefined);
  const painted = useRef<TriedLevels>(undefined);

  useEffect(() => {
    const old = shown.current?.from === levels.from ? shown.current.levels : levels.plan;
    const place = {
      axis,
      x: (at: number) => xOf(axis, width, at),
      y: (level: number) => Math.min(value.height, Math.max(0, yOf(value, level))),
    };
    const draw = (share: number) => {
      const between = levels.tried.map((level, index) => {
        const before = old[index] ?? level;
        return before + (level - before) * share;
      });
      shown.current = { from: levels.from, levels: between };
      path.current?.setAttribute('d', levels.differsAt === undefined ? '' : triedPath(levels, between, place));
    };
    const began = performance.now();
    const still = window.matchMedia('(prefers-reduced-motion: reduce)').matches;
    let frames = 0;
    let frame = requestAnimationFrame(function next(now) {
      const share = still ? 1 : Math.min(1, Math.max(0, now - began) / MORPH);
      draw(1 - (1 - share) ** 3);
      frames += 1;
      // What the first frame drew is on the screen by the second one.
      if (frames === 2 && painted.current !== levels) {
        painted.current = levels;
        onPainted();
      }
      if (share < 1 || frames < 2) frame = requestAnimationFrame(next);
    });
    return () => cancelAnimationFrame(frame);
  }, [axis, width, value, levels, onPainted]);

  return (
    <NotesLayer width={width} height={value.height}>
      <path ref={path} data-tried fill="none" className="stroke-ink" strokeWidth="1.6" strokeDasharray="5 4" />
      {meets && isOn(axis, meets.at) && (
        <MeetingMark axis={axis} width={width} value={value} at={meets.at} meets={meets.level} />
      )}
    </NotesLayer>
  );
}
