'use client';

import { useTranslations } from 'next-intl';
import { dayRange } from '@/lib/calendar/format';
import { useSheet } from './sheet-context';
import { useUnits } from './use-units';
import { WeekNavigation } from './week-navigation';

/** Whose pool, which week, how much water. */
export function PoolFacts() {
  const t = useTranslations('week');
  const { sheet } = useSheet();
  const units = useUnits();
  const { household, pool, days } = sheet;
  const [first, last] = [days[0]?.day, days.at(-1)?.day];
  return (
    <section>
      <p className="font-display text-[25px] leading-[30px] font-section">{household.name}</p>
      {first !== undefined && last !== undefined && (
        <p className="mt-1.25 text-[15px] leading-5 font-control">
          {dayRange(first, last, household.locale, t('rangeJoiner'))}
        </p>
      )}
      <p className="mt-1.25 text-small text-ink-2">
        {t('poolFacts', {
          year: last?.slice(0, 4) ?? '',
          volume: units.quantity(pool.volume, 'volume'),
          surface: t(`surface.${pool.surface}`),
        })}
      </p>
      <WeekNavigation />
    </section>
  );
}
