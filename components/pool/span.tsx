'use client';

import { classNames } from '@/components/ui/class-names';
import { DrawingText } from './drawing/drawing-text';
import { px } from './drawing/outline-path';
import { useWidth } from './drawing/use-width';

type SpanEnd = 'from' | 'to';

export type SpanProps = {
  /** Hours of the wall clock, 0 to 24; `from` after `to` runs over midnight. */
  from: number;
  to: number;
  onChange: (end: SpanEnd, hour: number) => void;
  /** Read out on the two handles. */
  labels: Record<SpanEnd, string>;
  /** An hour as it is written, "9:30". */
  write: (hour: number) => string;
  /** In the bar: how long it is. */
  words: string;
  midnight: string;
  /** Fineness of the handles [h]. */
  step?: number;
  /** Drawn above the bar, in the same hours: the sun. */
  children?: (place: (hour: number) => number) => React.ReactNode;
  /** Room above the bar [px]. */
  above?: number;
  problem?: string | undefined;
};

const inset = 12;
/** Two engraved strokes that mark a handle. */
const strokes = {
  '--handle':
    'linear-gradient(to right, transparent 34%, var(--ink) 34% 41%, transparent 41% 59%, var(--ink) 59% 66%, transparent 66%)',
} as React.CSSProperties;
const bar = { height: 22, top: 6 };

/** A bar over the hours of a day with two handles: the browser's own sliders, so that arrow keys work. */
export function Span(props: SpanProps) {
  const { from, to, onChange, labels, write, words, midnight, step = 0.25, children, above = 0, problem } = props;
  const [frame, width] = useWidth(358);
  const place = (hour: number) => inset + (hour / 24) * (width - 2 * inset);
  const filled =
    from <= to
      ? [[from, to] as const]
      : ([
          [from, 24],
          [0, to],
        ] as const);
  const longest = [...filled].sort((a, b) => b[1] - b[0] - (a[1] - a[0]))[0] ?? [from, to];
  const room = place(longest[1]) - place(longest[0]);
  const top = above + bar.top;
  return (
    <div ref={frame} className="relative w-full touch-pan-y">
      <svg width={width} height={above + 56} aria-hidden="true" className="block max-w-full">
        {children?.(place)}
        <rect
          x={inset}
          y={top}
          width={px(width - 2 * inset)}
          height={bar.height}
          className={classNames('fill-paper-lift', problem === undefined ? 'stroke-ink' : 'stroke-terra-ink')}
          strokeWidth="1.4"
        />
        {filled.map(([start, end]) => (
          <rect
            key={start}
            x={px(place(start))}
            y={top}
            width={px(place(end) - place(start))}
            height={bar.height}
            className="fill-ink"
          />
        ))}
        {room > 90 ? (
          <text
            x={px((place(longest[0]) + place(longest[1])) / 2)}
            y={top + 15.5}
            textAnchor="middle"
            className="fill-on-ink text-chart font-strong"
          >
            {words}
          </text>
        ) : null}
        {place(Math.min(from, to)) > 90 ? (
          <DrawingText x={inset} y={top + 43} weight="plain">
            {midnight}
          </DrawingText>
        ) : null}
        {place(Math.max(from, to)) < width - 90 ? (
          <DrawingText x={width - inset} y={top + 43} weight="plain" anchor="end">
            {midnight}
          </DrawingText>
        ) : null}
        {(['from', 'to'] as const).map((end) => {
          const hour = end === 'from' ? from : to;
          const x = place(hour);
          const other = place(end === 'from' ? to : from);
          // Near the edge a figure leans inwards; two handles close together put theirs on either side.
          const beside = Math.abs(x - other) < 66 ? (x < other ? 'end' : 'start') : 'middle';
          const anchor = x < 30 ? 'start' : x > width - 30 ? 'end' : beside;
          return (
            <DrawingText key={end} x={px(x)} y={top + 43} anchor={anchor}>
              {write(hour)}
            </DrawingText>
          );
        })}
      </svg>
      {(['from', 'to'] as const).map((end) => (
        <input
          key={end}
          type="range"
          min={0}
          max={24}
          step={step}
          value={end === 'from' ? from : to}
          aria-label={labels[end]}
          aria-valuetext={write(end === 'from' ? from : to)}
          aria-invalid={problem === undefined ? undefined : true}
          onChange={(event) => onChange(end, event.target.valueAsNumber)}
          style={{ ...strokes, top: top - 11 }}
          className={classNames(
            'pointer-events-none absolute inset-x-0 m-0 h-11 w-full cursor-ew-resize appearance-none bg-transparent outline-none',
            '[&::-webkit-slider-thumb]:pointer-events-auto [&::-webkit-slider-thumb]:h-8.5 [&::-webkit-slider-thumb]:w-6 [&::-webkit-slider-thumb]:appearance-none [&::-webkit-slider-thumb]:rounded-tick [&::-webkit-slider-thumb]:border-due [&::-webkit-slider-thumb]:border-solid [&::-webkit-slider-thumb]:border-ink [&::-webkit-slider-thumb]:bg-paper-lift [&::-webkit-slider-thumb]:[background-image:var(--handle)]',
            '[&::-moz-range-thumb]:pointer-events-auto [&::-moz-range-thumb]:h-7.5 [&::-moz-range-thumb]:w-5 [&::-moz-range-thumb]:rounded-tick [&::-moz-range-thumb]:border-due [&::-moz-range-thumb]:border-solid [&::-moz-range-thumb]:border-ink [&::-moz-range-thumb]:bg-paper-lift [&::-moz-range-thumb]:[background-image:var(--handle)]',
            'focus-visible:[&::-webkit-slider-thumb]:outline-3 focus-visible:[&::-webkit-slider-thumb]:outline-offset-2 focus-visible:[&::-webkit-slider-thumb]:outline-teal focus-visible:[&::-webkit-slider-thumb]:outline-solid',
            'focus-visible:[&::-moz-range-thumb]:outline-3 focus-visible:[&::-moz-range-thumb]:outline-offset-2 focus-visible:[&::-moz-range-thumb]:outline-teal focus-visible:[&::-moz-range-thumb]:outline-solid',
          )}
        />
      ))}
    </div>
  );
}
