'use client';

import { useTranslations } from 'next-intl';
import { useLayoutEffect, useRef } from 'react';
import { ChartPatterns } from '@/components/charts/patterns';
import { shareOf } from '@/components/charts/time-axis';
import { ChlorineWeekLane, LazyPlumbLines, PHLane, StabilizerLane, WeekCursorLine } from './chart-lanes';
import { Colophon } from './colophon';
import { DayHeads } from './day-heads';
import { DayRules } from './day-rules';
import { HighLowLane } from './high-low-lane';
import { lanesFoot } from './lane';
import { margin, tryIt } from './parts-that-follow';
import { useSheet } from './sheet-context';
import { SheetTables } from './sheet-tables';
import { StopLine } from './stop-line';
import { SunLane } from './sun-lane';
import { ToDoLane } from './to-do-lane';
import { useElementWidth } from './use-element-width';
import { useLaneAxes } from './use-lane-axes';

/** Seven day-columns on one time axis, with the margin column beside or below them. */
export function DeskSheet() {
  return (
    <div className="px-margin lg:grid lg:grid-cols-[minmax(0,1fr)_326px] lg:gap-x-7.5">
      <div className="min-w-0 pt-1">
        <Lanes />
        <StopLine className="mt-3 max-w-reading lg:max-w-none" />
        <div className="mt-3 grid gap-1.5 pb-5">
          <Colophon />
          <SheetTables />
        </div>
      </div>
      <aside className="grid content-start gap-x-7.5 border-t border-ink pt-3.5 pb-6 sm:grid-cols-2 md:grid-cols-3 lg:grid-cols-1 lg:border-t-0">
        {margin}
        {tryIt}
      </aside>
    </div>
  );
}

function Lanes() {
  const t = useTranslations('week.lane');
  const [width, plot] = useElementWidth();
  const axes = useLaneAxes();
  const scroller = useTodayFirst();
  return (
    <div
      ref={scroller}
      role="region"
      aria-label={t('scroll')}
      tabIndex={0}
      className="overflow-x-auto [--gutter:112px] md:overflow-visible md:[--gutter:108px] lg:[--gutter:118px]"
    >
      <div className="relative min-w-[1022px] md:min-w-0">
        <ChartPatterns />
        {width > 0 && <LazyPlumbLines width={width} axes={axes} />}
        <div ref={plot} className="pointer-events-none absolute inset-y-0 right-0 left-[var(--gutter)]">
          <DayRules />
          <WeekCursorLine height={lanesFoot} />
        </div>
        <DayHeads />
        <SunLane />
        <ChlorineWeekLane width={width} value={axes.freeChlorine} />
        <HighLowLane />
        <PHLane width={width} value={axes.pH} />
        <StabilizerLane width={width} value={axes.cyanuricAcid} />
        <ToDoLane />
      </div>
    </div>
  );
}

/** Where the sheet is wider than the page it opens with today at its left. */
function useTodayFirst() {
  const ref = useRef<HTMLDivElement>(null);
  const { axis, days, now } = useSheet().picture;
  const today = days.find(({ from, to }) => now >= from && now < to);
  const share = today ? shareOf(axis, today.from) : 0;
  useLayoutEffect(() => {
    const scroller = ref.current;
    if (scroller === null) return;
    const gutter = scroller.querySelector<HTMLElement>('.sticky')?.offsetWidth ?? 0;
    scroller.scrollLeft = share * (scroller.scrollWidth - gutter);
  }, [share]);
  return ref;
}
