'use client';

import { ErrorBar, Scatter, type ScatterShapeProps } from 'recharts';
import { layer } from './lane-chart';

/** A measured value, or the interval that a strip gave between two of its steps. `spread`: half a whisker's length. */
export type ChartTest = {
  id: string;
  at: number;
  value: number;
  spread: number;
  between?: { low: number; high: number };
};

/**
 * Tests in a chart: a hollow dot whose whisker is how exact the method is, or, for a strip read between two steps, an
 * I-bar from step to step without a dot.
 */
export function TestMarks({ tests, radius = 4.6 }: { tests: readonly ChartTest[]; radius?: number }) {
  const dots = tests.filter(({ between }) => between === undefined);
  const bars = tests.flatMap(({ at, between }) =>
    between === undefined
      ? []
      : [{ at, value: (between.low + between.high) / 2, spread: (between.high - between.low) / 2 }],
  );
  // A Scatter without points of its own would take those of the chart.
  return (
    <>
      {dots.length > 0 && (
        <Scatter
          data={dots}
          dataKey="value"
          shape={({ cx, cy }: ScatterShapeProps) => (
            <circle cx={cx} cy={cy} r={radius} className="fill-paper-lift stroke-ink" strokeWidth="1.8" />
          )}
          isAnimationActive={false}
          zIndex={layer.test}
        >
          <ErrorBar {...whisker} width={3} strokeWidth={1.3} />
        </Scatter>
      )}
      {bars.length > 0 && (
        <Scatter data={bars} dataKey="value" shape={() => <g />} isAnimationActive={false} zIndex={layer.test}>
          <ErrorBar {...whisker} width={5} strokeWidth={1.5} />
        </Scatter>
      )}
    </>
  );
}

const whisker = {
  dataKey: 'spread',
  direction: 'y',
  fill: 'none',
  stroke: 'currentColor',
  isAnimationActive: false,
  zIndex: layer.test - 1,
} as const;
