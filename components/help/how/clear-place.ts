import type { Curve, Level } from '@/lib/client/worked-out/examples/curve';
import { shareOf } from './curve-path';

/** What words take on a phone, as shares of the picture. */
const WORDS = { wide: 0.5, high: 0.12 };
const places = [0, 0.15, 0.3, 0.45];

/** Where along a level its words stand without lying on a line: at the left where that is free. */
export function clearPlace({ across, up, lines, ranges = [] }: Curve, level: Level): number {
  const base = shareOf(level.at, up);
  const [from, to] = level.forbidden === 'below' ? [base - WORDS.high, base] : [base, base + WORDS.high];
  const drawn = [...lines.map(({ points }) => points), ...ranges.flatMap(({ low, high }) => [low, high])];
  const isClear = (place: number) =>
    drawn.every((points) =>
      points.every(([x, y]) => {
        const [right, height] = [shareOf(x, across), shareOf(y, up)];
        return right < place || right > place + WORDS.wide || height < from || height > to;
      }),
    );
  return places.find(isClear) ?? 0;
}
