'use client';

import { useTranslations } from 'next-intl';
import type { Curve, Point } from '@/lib/client/worked-out/examples/curve';
import { percentOf, shareOf } from './curve-path';

/** Least distance of the middle of words from a line or a limit, and from other words, as shares of the height. */
const FROM_LINES = 0.05;
const FROM_WORDS = 0.085;
const LEVEL_WORDS = 0.08;
/** How much of the width words at the right end may take on a phone. */
const WIDTH = 0.35;
const steps = Array.from(
  { length: 40 },
  (_, index) => (index % 2 === 0 ? 1 : -1) * (0.06 + 0.02 * Math.floor(index / 2)),
);

/** The name of each line at its right end, above it or below it: never on a line, a limit or other words. */
export function LineWords({ curve }: { curve: Curve }) {
  const t = useTranslations('how-examples');
  return placesOf(curve).map(({ name, height }) => (
    <span
      key={name}
      className="absolute right-1.5 -translate-y-1/2 px-1 text-chart"
      style={{ top: percentOf(1 - height) }}
    >
      {t(`figure.${name}`)}
    </span>
  ));
}

function placesOf({ lines, ranges = [], levels = [], across, up }: Curve) {
  const drawn = [...ranges.map(({ name, high }) => ({ name, points: high })), ...lines];
  const named = drawn.filter(({ name }, index) => drawn.findIndex((other) => other.name === name) === index);
  /** Between which heights a line runs where the words would stand. */
  const spanOf = (points: readonly Point[]) => {
    const heights = points.filter(([x]) => shareOf(x, across) > 1 - WIDTH).map(([, y]) => shareOf(y, up));
    return { low: Math.min(...heights), high: Math.max(...heights) };
  };
  const inTheWay = [
    ...[...drawn.map(({ points }) => points), ...ranges.map(({ low }) => low)].map(spanOf),
    // The words of a limit stand on its far side.
    ...levels.map(({ at, forbidden }) => {
      const share = shareOf(at, up);
      return forbidden === 'below'
        ? { low: share - LEVEL_WORDS, high: share }
        : { low: share, high: share + LEVEL_WORDS };
    }),
  ];
  const placed: { name: (typeof drawn)[number]['name']; height: number }[] = [];
  for (const { name, points } of named) {
    const end = shareOf(points.at(-1)?.[1] ?? up.low, up);
    const isFree = (height: number) =>
      height > 0.05 &&
      height < 0.95 &&
      inTheWay.every(({ low, high }) => height < low - FROM_LINES || height > high + FROM_LINES) &&
      placed.every((other) => Math.abs(other.height - height) >= FROM_WORDS);
    const height = steps.map((step) => end + step).find(isFree) ?? Math.min(0.95, Math.max(0.06, end + 0.06));
    placed.push({ name, height });
  }
  return placed;
}
