'use client';

import { shareOf } from '@/components/charts/time-axis';
import { intervalsOfDay } from '@/lib/calendar/wall-time';
import { useSheet } from './sheet-context';
import type { SheetDay } from './sheet-times';
import { useUnits } from './use-units';

/** One drawn head stands for two swimmer-hours, and the figure beside the heads says how many there are. */
const HOURS_PER_HEAD = 2;
const MOST_HEADS = 7;
const APART = 9;

/** Heads in the water over a wave, in the middle of the swim hours: filled when the day is past, hollow ahead. */
export function SwimmerHeads({ day, top }: { day: SheetDay; top: number }) {
  const { sheet, picture } = useSheet();
  const units = useUnits();
  const [swimHours] = intervalsOfDay([sheet.pool.swimHours], day.day, sheet.household.timeZone);
  if (day.swimmerHours <= 0 || swimHours === undefined) return null;
  const heads = Math.min(MOST_HEADS, Math.ceil(day.swimmerHours / HOURS_PER_HEAD));
  const width = (heads - 1) * APART + 10;
  const past = swimHours.to <= picture.now;
  return (
    <span
      className="absolute flex -translate-x-1/2 items-start gap-1"
      style={{ left: `${shareOf(day, (swimHours.from + swimHours.to) / 2) * 100}%`, top: top + 6 }}
    >
      <span className="text-figure font-strong">{units.number(day.swimmerHours)}</span>
      <svg width={width} height="16" viewBox={`0 0 ${width} 16`} className="overflow-visible stroke-ink">
        {Array.from({ length: heads }, (_, head) => (
          <circle
            key={head}
            cx={5 + head * APART}
            cy="6"
            r="3.1"
            strokeWidth="1.3"
            className={past ? 'fill-ink' : 'fill-paper'}
          />
        ))}
        <path d={`M0 12.5${'q2.25 -2.6 4.5 0t4.5 0'.repeat(heads)}`} fill="none" strokeWidth="1.1" />
      </svg>
    </span>
  );
}
