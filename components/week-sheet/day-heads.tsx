'use client';

import { useTranslations } from 'next-intl';
import { shareOf } from '@/components/charts/time-axis';
import { dayHeading, longDay } from '@/lib/calendar/format';
import { Lane, placeOf } from './lane';
import { useSheet } from './sheet-context';
import { hourMarksOf, type SheetDay } from './sheet-times';

/** Names of the seven days and the hours of each; today on ink. */
export function DayHeads() {
  const { picture } = useSheet();
  return (
    <Lane name="head" first gutter={null}>
      {picture.days.map((day) => (
        <div key={day.day} className="absolute inset-y-0" style={placeOf(picture.axis, day)}>
          <DayHead day={day} />
          <HourMarks day={day} />
        </div>
      ))}
    </Lane>
  );
}

function DayHead({ day }: { day: SheetDay }) {
  const t = useTranslations('week.lane');
  const { sheet, picture } = useSheet();
  const { locale } = sheet.household;
  const isToday = picture.now >= day.from && picture.now < day.to;
  const isPast = day.to <= picture.now;
  const tone = isToday ? 'bg-ink text-on-ink' : isPast ? 'text-ink-2' : '';
  return (
    <h2
      className={`mt-1 flex h-6.5 items-center justify-between px-2.25 text-name ${tone}`}
      aria-label={longDay(day.day, locale)}
      aria-current={isToday ? 'date' : undefined}
    >
      <span className="font-display whitespace-nowrap">{dayHeading(day.day, locale)}</span>
      {isToday && <span className="text-chart font-emphasis">{t('todayMark')}</span>}
    </h2>
  );
}

function HourMarks({ day }: { day: SheetDay }) {
  const t = useTranslations('week.lane');
  const { sheet } = useSheet();
  return hourMarksOf(day, sheet.household.timeZone).map(({ hour, at }) => (
    <span
      key={hour}
      aria-hidden="true"
      className="absolute bottom-0 flex -translate-x-1/2 flex-col items-center text-figure text-ink-2"
      style={{ left: `${shareOf(day, at) * 100}%` }}
    >
      <span className="mb-0.25">{hour === '12' ? t('noon') : hour === '06' ? t('six') : t('eighteen')}</span>
      <span className="h-1.25 border-l border-rule-2" />
    </span>
  ));
}
