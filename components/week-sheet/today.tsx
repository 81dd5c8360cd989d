'use client';

import { Coffee } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { waterAt } from '@/components/charts/water-curve';
import { dayHeading } from '@/lib/calendar/format';
import { limits } from '@/lib/standards/limits';
import { DayItems } from './day-items';
import { useSheet } from './sheet-context';
import type { SheetDay } from './sheet-times';
import { TodayChart } from './today-chart';
import { toDoOf } from './to-do-items';
import { useUnits } from './use-units';
import { turnsWeeks } from './week-turning';

/** Today on a phone: its curve, pH and stabilizer, and what there is to do. */
export function Today() {
  const { picture } = useSheet();
  const today = picture.days.find(({ from, to }) => picture.now >= from && picture.now < to);
  return today ? <TodayOf day={today} /> : null;
}

function TodayOf({ day }: { day: SheetDay }) {
  const t = useTranslations('week');
  const { sheet, picture } = useSheet();
  const planned = picture.planEndsAt !== undefined && day.from < picture.planEndsAt;
  const items = toDoOf(day, sheet);
  const nothingToAdd = !items.some((item) => item.kind === 'dose' && item.dose.status === 'planned');
  return (
    <section data-turns-weeks="" className={`mt-5.5 ${turnsWeeks.className}`}>
      <h2 className="flex h-10 items-center justify-between bg-ink px-3 text-on-ink">
        <span className="font-display text-[20px] font-headline">{dayHeading(day.day, sheet.household.locale)}</span>
        <span className="text-label font-emphasis">{t('lane.todayMark')}</span>
      </h2>
      <TodayChart day={day} />
      <Facts />
      {items.length > 0 && (
        <div className="border-b border-rule py-3">
          <DayItems items={items} />
        </div>
      )}
      {nothingToAdd && (
        <p className="flex gap-2.5 border-b border-ink py-3 font-strong">
          <Coffee aria-hidden="true" className="mt-0.5 size-5.25" />
          {t(planned ? 'phone.nothingToday' : 'lane.noPlanDay')}
        </p>
      )}
    </section>
  );
}

function Facts() {
  const t = useTranslations('week.phone');
  const { sheet, picture } = useSheet();
  const units = useUnits();
  const water = waterAt(picture.points, picture.now);
  const [low, high] = sheet.pool.stabilizerBand;
  const keepPH = {
    low: units.figure(limits.pHRangeLow.value, 'pH'),
    high: units.figure(limits.pHRangeHigh.value, 'pH'),
  };
  const keepStabilizer = { low: units.figure(low, 'cyanuricAcid'), high: units.figure(high, 'cyanuricAcid') };
  const pH = water ? units.figure(water.pH.middle, 'pH') : t('notKnown');
  const stabilizer = water ? units.figure(water.cyanuricAcid.middle, 'cyanuricAcid') : t('notKnown');
  return (
    <div className="grid grid-cols-2 border-b border-rule text-small text-ink-2">
      <p className="py-2.5">
        <b className="block text-field text-ink">{t('pHNow', { value: pH })}</b>
        {t('keepPH', keepPH)}
      </p>
      <p className="border-l border-rule py-2.5 pl-3.5">
        <b className="block text-field text-ink">{t('stabilizerNow', { value: stabilizer })}</b>
        {t('keepPH', keepStabilizer)}
      </p>
    </div>
  );
}
