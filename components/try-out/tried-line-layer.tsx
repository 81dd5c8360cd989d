'use client';

import type { TimeAxis } from '@/components/charts/time-axis';
import { TriedLine } from '@/components/charts/tried-line';
import type { ValueAxis } from '@/components/charts/value-axis';
import { useTriedLine } from './tried-line-store';

/** The tried week over a lane of free chlorine; nothing while nothing is tried. */
export function TriedLineLayer({ axis, width, value }: { axis: TimeAxis; width: number; value: ValueAxis }) {
  const line = useTriedLine();
  if (line === undefined || width === 0) return null;
  return <TriedLine axis={axis} width={width} value={value} {...line} onPainted={markCurve} />;
}

function markCurve() {
  performance.mark('try-it:curve');
}
