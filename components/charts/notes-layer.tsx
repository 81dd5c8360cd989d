import type { ReactNode } from 'react';

/** A drawing over a chart: marks and words. What it says stands in the chart's sentence and its table. */
export function NotesLayer({ width, height, children }: { width: number; height: number; children: ReactNode }) {
  return (
    <svg
      width={width}
      height={height}
      viewBox={`0 0 ${width} ${height}`}
      aria-hidden="true"
      className="pointer-events-none absolute top-0 left-0 overflow-visible"
    >
      {children}
    </svg>
  );
}
