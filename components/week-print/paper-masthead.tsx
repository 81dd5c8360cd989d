'use client';

import { useTranslations } from 'next-intl';
import { BrandMark } from '@/components/navigation/brand-mark';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { useUnits } from '@/components/week-sheet/use-units';
import { dayRange } from '@/lib/calendar/format';

/** Whose pool and which week. */
export function PaperMasthead() {
  const t = useTranslations('week');
  const { household, pool, days } = useSheet().sheet;
  const units = useUnits();
  const [first, last] = [days[0]?.day ?? '', days.at(-1)?.day ?? ''];
  return (
    <header className="grid grid-cols-[minmax(0,1fr)_auto] items-end gap-x-4 pb-1.5">
      <div className="flex items-center gap-3">
        <BrandMark className="size-8" />
        <h1 className="font-display text-[24px] leading-[27px] font-headline">{household.name}</h1>
      </div>
      <div className="text-right">
        <p className="font-display text-section">{dayRange(first, last, household.locale, t('rangeJoiner'))}</p>
        <p className="text-small">
          {t('poolFacts', {
            year: last.slice(0, 4),
            volume: units.quantity(pool.volume, 'volume'),
            surface: t(`surface.${pool.surface}`),
          })}
        </p>
      </div>
    </header>
  );
}
