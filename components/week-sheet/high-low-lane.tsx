'use client';

import { useTranslations } from 'next-intl';
import { type Extreme, highAndLowOf } from './high-and-low';
import { Lane, Nights, placeOf } from './lane';
import { useSheet } from './sheet-context';
import type { SheetDay } from './sheet-times';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

/** High and low water of each day, as a tide table gives them. */
export function HighLowLane() {
  const t = useTranslations('week.lane');
  const { picture } = useSheet();
  return (
    <Lane
      name="highLow"
      gutter={
        <div aria-hidden="true" className="pt-1 text-figure leading-[14px] text-ink-2">
          <p>{t('high')}</p>
          <p>{t('low')}</p>
        </div>
      }
    >
      <Nights axis={picture.axis} nights={picture.nights} />
      {picture.days.map((day) => (
        <div key={day.day} className="absolute inset-y-0 pt-1 pl-2.5" style={placeOf(picture.axis, day)}>
          <DayExtremes day={day} />
        </div>
      ))}
    </Lane>
  );
}

function DayExtremes({ day }: { day: SheetDay }) {
  const t = useTranslations('week.lane');
  const { sheet, picture } = useSheet();
  const extremes = highAndLowOf(day, picture.points, sheet.household.timeZone);
  if (extremes === undefined) return <p className="text-chart leading-[28px] text-ink-2">{t('noHighLow')}</p>;
  return (
    <dl className="text-chart leading-[14px] text-ink-2">
      <ExtremeLine name={t('high')} extreme={extremes.high} />
      <ExtremeLine name={t('low')} extreme={extremes.low} />
    </dl>
  );
}

function ExtremeLine({ name, extreme: { value, part } }: { name: string; extreme: Extreme }) {
  const times = useTimes();
  const units = useUnits();
  return (
    <div className="flex gap-2.25">
      <dt className="sr-only">{name}</dt>
      <dd className="flex gap-2.25 bg-transparent whitespace-nowrap">
        <b className="text-ink">{units.figure(value, 'freeChlorine')}</b>
        <span>{times.partShort(part)}</span>
      </dd>
    </div>
  );
}
