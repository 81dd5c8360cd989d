'use client';

import { useTranslations } from 'next-intl';
import { useMemo } from 'react';
import { chlorineDayAxis } from '@/components/charts/lane-axes';
import { cutTo, shareOf } from '@/components/charts/time-axis';
import { ticksOf } from '@/components/charts/value-axis';
import { wholeCourse } from '@/components/charts/water-curve';
import { wallTimeText } from '@/lib/calendar/format';
import { chartTests } from './chart-input';
import { LazyChlorineDayPicture, LazyCursorLine } from './chart-lanes';
import { TODAY } from './cursor-names';
import { Nights, NowRule } from './lane';
import { AxisFigures } from './lane-name';
import { useSheet } from './sheet-context';
import { courseOn } from './sheet-picture';
import { hourMarksOf, type SheetDay } from './sheet-times';
import { SunBars } from './sun-bars';
import { belowWords } from './sun-lane';
import { SwimmerHeads } from './swimmer-heads';
import { useElementWidth } from './use-element-width';
import { useUnits } from './use-units';

const HEIGHT = 208;
const SUN_BASE = 46;

/** The day's sun, swimmers and free chlorine on the day's own axis. */
export function TodayChart({ day }: { day: SheetDay }) {
  const { sheet, picture } = useSheet();
  const [width, plot] = useElementWidth({ whenNear: true });
  const units = useUnits();
  const axis = useMemo(() => ({ from: day.from, to: day.to }), [day.from, day.to]);
  const course = useMemo(() => courseOn(sheet, axis), [sheet, axis]);
  const points = wholeCourse(course);
  const nights = picture.nights.flatMap((night) => cutTo(axis, night) ?? []);
  const tests = chartTests(sheet.readings, 'freeChlorine').filter(({ at }) => at >= day.from && at < day.to);
  const { swimLimit } = sheet.pool;
  const measured = tests.map(({ value, between }) => between?.high ?? value);
  const value = chlorineDayAxis(points, swimLimit, measured, HEIGHT);
  return (
    <div className="grid grid-cols-[22px_minmax(0,1fr)]">
      <div />
      <div className="relative h-15.5">
        <Nights axis={axis} nights={nights} />
        <DaySun day={day} />
        {width > 0 && <LazyCursorLine axis={axis} syncId={TODAY} />}
      </div>
      <div className="relative" style={{ height: HEIGHT }}>
        <AxisFigures value={value} figures={ticksOf(value, 36).map((at) => ({ at, words: units.number(at) }))} />
      </div>
      <div ref={plot} data-plot="today" className="relative border-b border-rule-2" style={{ height: HEIGHT }}>
        {width > 0 && <LazyChlorineDayPicture axis={axis} width={width} value={value} />}
      </div>
      <div />
      <Hours day={day} />
    </div>
  );
}

function DaySun({ day }: { day: SheetDay }) {
  const t = useTranslations('week');
  const { now } = useSheet().picture;
  const units = useUnits();
  const fullSun = day.sun.reduce((sum, share) => sum + share, 0);
  return (
    <div role="img" aria-label={t('chart.sunLabel')}>
      <SunBars day={day} base={SUN_BASE} tallest={34} width={3.4} />
      <div className="absolute inset-x-0 border-t border-rule-2" style={{ top: SUN_BASE }} />
      <span className="absolute top-1 left-1 text-chart text-ink-2">
        {t('phone.sunHours', { hours: units.number(fullSun, 1) })}
      </span>
      <SwimmerHeads day={day} top={SUN_BASE - 5} />
      <NowRule left={shareOf(day, now)} top={belowWords(now, day)} />
    </div>
  );
}

function Hours({ day }: { day: SheetDay }) {
  const t = useTranslations('week.lane');
  const { sheet } = useSheet();
  const { timeZone, locale } = sheet.household;
  return (
    <div aria-hidden="true" className="relative h-6 text-chart text-ink-2">
      {hourMarksOf(day, timeZone).map(({ hour, at }) => (
        <span
          key={hour}
          className="absolute flex -translate-x-1/2 flex-col items-center"
          style={{ left: `${shareOf(day, at) * 100}%` }}
        >
          <span className="h-1.25 border-l border-rule-2" />
          {hour === '12' ? t('noon') : wallTimeText(`${hour}:00`, locale)}
        </span>
      ))}
    </div>
  );
}
