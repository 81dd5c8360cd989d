'use client';

import { shareOf } from '@/components/charts/time-axis';
import { useSheet } from './sheet-context';
import type { SheetDay } from './sheet-times';

const HOUR = 3_600_000;
/** Below this share of the reference sun a bar would be a speck. */
const SPECK = 0.03;

type Props = {
  day: SheetDay;
  /** The line on which the bars stand, from the top [px]; how tall one of full sun is, how wide each. */
  base: number;
  tallest: number;
  width: number;
};

/** Sun on the water, a bar for each hour of the day: fainter while it is only expected. */
export function SunBars({ day, base, tallest, width }: Props) {
  const { now } = useSheet().picture;
  return day.sun.map((share, hour) => {
    if (share < SPECK) return null;
    const middle = day.from + (hour + 0.5) * HOUR;
    return (
      <span
        key={hour}
        className={`absolute bg-ink ${middle < now ? 'opacity-[.82]' : 'opacity-[.56]'}`}
        style={{
          left: `calc(${shareOf(day, middle) * 100}% - ${width / 2}px)`,
          top: base - share * tallest,
          height: share * tallest,
          width,
        }}
      />
    );
  });
}
