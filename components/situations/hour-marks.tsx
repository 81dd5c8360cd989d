'use client';

import { useTranslations } from 'next-intl';
import { shareOf } from '@/components/charts/time-axis';
import { wallToInstant } from '@/lib/calendar/wall-time';
import type { StepDay } from './step-days';

const marks = { six: '06:00', noon: '12:00', eighteen: '18:00' } as const;

/** 6, noon and 18 of a day; a clock change moves them along the column. */
export function HourMarks({ day, timeZone }: { day: StepDay; timeZone: string }) {
  const t = useTranslations('situations.chart');
  return (['six', 'noon', 'eighteen'] as const).map((mark) => (
    <span
      key={mark}
      aria-hidden="true"
      className="absolute bottom-0 flex -translate-x-1/2 flex-col items-center text-figure text-ink-2"
      style={{ left: `${shareOf(day, wallToInstant(day.day, marks[mark], timeZone).instant) * 100}%` }}
    >
      <span className="mb-0.25">{t(mark)}</span>
      <span className="h-1.25 border-l border-rule-2" />
    </span>
  ));
}
