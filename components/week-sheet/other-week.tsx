'use client';

import { useTranslations } from 'next-intl';
import { dayRange } from '@/lib/calendar/format';
import { useSheet } from './sheet-context';
import { WeekNavigation } from './week-navigation';
import { isThisWeek } from './weeks';

/** On a phone, at the head of any week but that of now: which week this is, and the way back. */
export function OtherWeek() {
  const t = useTranslations('week');
  const { sheet, picture } = useSheet();
  const [first, last] = [sheet.days[0]?.day, sheet.days.at(-1)?.day];
  if (isThisWeek(picture) || first === undefined || last === undefined) return null;
  return (
    <section className="px-margin pt-3 sm:hidden">
      <p className="font-display text-section">{dayRange(first, last, sheet.household.locale, t('rangeJoiner'))}</p>
      <WeekNavigation />
    </section>
  );
}
