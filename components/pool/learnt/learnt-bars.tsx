'use client';

import { DrawingText } from '../drawing/drawing-text';
import { px } from '../drawing/outline-path';
import { useWidth } from '../drawing/use-width';
import type { LearntRange } from '@/lib/schemas/learnt';
import { barAxis } from './bar-axis';
import { besideBar, widthOf } from './beside-bar';

/** Half a figure of the first tick, half of the last. */
const MARGIN = { left: 14, right: 20 };
const BAR = 14;

export type LearntBarsProps = {
  /** In the units of the axis. */
  before: LearntRange;
  learnt: LearntRange;
  beforeWords: string;
  learntWords: string;
  /** A figure of the axis, and the last one with its unit. */
  tick: (value: number, decimals: number) => string;
  lastTick: (value: number, decimals: number) => string;
};

/** What was assumed, dotted and hollow, above what was learnt, on one axis; a tick in each at its middle. */
export function LearntBars(props: LearntBarsProps) {
  const [frame, width] = useWidth(520, { whenNear: true });
  return (
    <div ref={frame} className="min-h-26 w-full">
      {width > 0 && <Bars {...props} width={width} />}
    </div>
  );
}

function Bars({
  before,
  learnt,
  beforeWords,
  learntWords,
  tick,
  lastTick,
  width,
}: LearntBarsProps & { width: number }) {
  const axis = barAxis(before, learnt);
  const along = (value: number) =>
    MARGIN.left + ((value - axis.from) / (axis.to - axis.from)) * (width - MARGIN.left - MARGIN.right);
  const spanOf = ({ p10, p50, p90 }: LearntRange) => ({ from: along(p10), middle: along(p50), to: along(p90) });
  const [upper, lower] = [spanOf(before), spanOf(learnt)];
  const beforePlace = besideBar(upper, beforeWords, width);
  const learntPlace = besideBar(lower, learntWords, width);
  const top = beforePlace.above ? 25 : 16;
  const below = top + BAR + (learntPlace.above ? 35 : 19);
  const line = below + BAR + 15;
  const link = [top + BAR + 4, below - 4] as const;
  return (
    <svg
      width={width}
      height={px(line + 26)}
      viewBox={`0 0 ${width} ${px(line + 26)}`}
      aria-hidden="true"
      className="block max-w-full"
    >
      <path
        d={`M${px(upper.middle)} ${link[0]}C${px(upper.middle)} ${link[0] + 7} ${px(lower.middle)} ${link[1] - 7} ${px(lower.middle)} ${link[1]}`}
        className="fill-none stroke-ink"
        strokeDasharray="1 3"
        strokeLinecap="round"
      />
      <rect
        x={px(upper.from)}
        y={top}
        width={px(upper.to - upper.from)}
        height={BAR}
        className="fill-none stroke-ink"
        strokeWidth="1.2"
        strokeDasharray="2 2.5"
      />
      <path d={`M${px(upper.middle)} ${top - 3}v${BAR + 6}`} className="fill-none stroke-ink" strokeWidth="1.4" />
      <rect x={px(lower.from)} y={below} width={px(lower.to - lower.from)} height={BAR} className="fill-band" />
      <path
        d={`M${px(lower.from)} ${below - 1}v${BAR + 2}M${px(lower.to)} ${below - 1}v${BAR + 2}`}
        className="fill-none stroke-teal"
        strokeWidth="1.6"
      />
      <path d={`M${px(lower.middle)} ${below - 4}v${BAR + 8}`} className="fill-none stroke-teal" strokeWidth="2.6" />
      <DrawingText
        weight="plain"
        x={px(beforePlace.x)}
        y={beforePlace.above ? top - 8 : top + 11}
        anchor={beforePlace.anchor}
      >
        {beforeWords}
      </DrawingText>
      <DrawingText x={px(learntPlace.x)} y={learntPlace.above ? below - 8 : below + 11} anchor={learntPlace.anchor}>
        {learntWords}
      </DrawingText>
      <Axis {...{ axis, along, line, width, tick, lastTick }} />
    </svg>
  );
}

function Axis({
  axis,
  along,
  line,
  width,
  tick,
  lastTick,
}: Pick<LearntBarsProps, 'tick' | 'lastTick'> & {
  axis: ReturnType<typeof barAxis>;
  along: (value: number) => number;
  line: number;
  width: number;
}) {
  const last = axis.ticks.length - 1;
  const lastWords = lastTick(axis.to, axis.decimals);
  // The last figure carries the unit and ends with the drawing; what it would run into goes without a figure.
  const free = width - widthOf(lastWords) - 6;
  return (
    <>
      <path d={`M${px(along(axis.from))} ${line}H${px(along(axis.to))}`} className="fill-none stroke-rule-2" />
      {axis.ticks.map((value, index) => {
        const x = along(value);
        const words = tick(value, axis.decimals);
        const shown = index < last && x + widthOf(words) / 2 < free;
        return (
          <g key={value}>
            <path d={`M${px(x)} ${line}v${index === last || shown ? 6 : 4}`} className="fill-none stroke-rule-2" />
            {shown ? (
              <text x={px(x)} y={line + 20} textAnchor="middle" className="fill-ink-2 text-figure">
                {words}
              </text>
            ) : null}
          </g>
        );
      })}
      <text x={width} y={line + 20} textAnchor="end" className="fill-ink-2 text-figure">
        {lastWords}
      </text>
    </>
  );
}
