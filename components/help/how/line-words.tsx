'use client';

import { useTranslations } from 'next-intl';
import type { Curve } from '@/lib/client/worked-out/examples/curve';
import { shareOf } from './curve-path';

const ROOM = 0.09;

/** The name of each line at its right end, moved apart where ends come close. */
export function LineWords({ curve }: { curve: Curve }) {
  const t = useTranslations('how-examples');
  const seen = new Set<string>();
  const ends = [
    ...(curve.ranges ?? []).map(({ name, high }) => ({ name, end: high.at(-1) })),
    ...curve.lines.map(({ name, points }) => ({ name, end: points.at(-1) })),
  ].filter(({ name }) => !seen.has(name) && seen.add(name));
  const heights = ends
    .map(({ name, end }) => ({ name, height: Math.min(0.92, Math.max(0.1, shareOf(end?.[1] ?? 0, curve.up) + 0.06)) }))
    .sort((a, b) => a.height - b.height);
  heights.forEach((entry, index) => {
    const below = heights[index - 1];
    if (below !== undefined) entry.height = Math.max(entry.height, below.height + ROOM);
  });
  const over = Math.max(0, (heights.at(-1)?.height ?? 0) - 0.94);
  return heights.map(({ name, height }) => (
    <span
      key={name}
      className="absolute right-1.5 -translate-y-1/2 bg-paper px-1 text-chart"
      style={{ top: `${100 * (1 - height + over)}%` }}
    >
      {t(`figure.${name}`)}
    </span>
  ));
}
