'use client';

import { useTranslations } from 'next-intl';
import { dayHeading, longDay, timeOfDay, weekdayName } from '@/lib/calendar/format';
import { dayOf, daysBetween } from '@/lib/calendar/household-day';
import { spokenPart } from '@/lib/calendar/part-of-day';
import { parseInstant } from '@/lib/calendar/wall-time';
import { useHousehold } from './situation-context';

/** An instant of a reply that has been checked [ms]. */
export function instantOf(iso: string): number {
  return parseInstant(iso) ?? Number.NaN;
}

/** Days and hours in the household's zone and language, as seen from an instant. */
export function useSituationTimes(now: number) {
  const t = useTranslations('situations.time');
  const { timeZone, locale } = useHousehold();
  const today = dayOf(now, timeZone);
  return {
    today,
    dayOf: (instant: number) => dayOf(instant, timeZone),
    clock: (instant: number) => timeOfDay(instant, timeZone, locale),
    /** "Mon 6". */
    heading: (day: string) => dayHeading(day, locale),
    /** "Sunday 12 July". */
    longDay: (day: string) => longDay(day, locale),
    /** "today", "tomorrow", "on Thursday", "on Thursday 12 July". */
    dayInWords: (instant: number) => {
      const day = dayOf(instant, timeZone);
      const days = daysBetween(today, day);
      if (days === 0) return t('today');
      if (days === 1) return t('tomorrow');
      return t('onDay', { day: Math.abs(days) < 7 ? weekdayName(day, locale) : longDay(day, locale) });
    },
    /** "this evening", "Thursday morning": ahead it is a part of a day, never minutes. */
    partAt: (instant: number) => {
      const { day, part } = spokenPart(instant, timeZone);
      if (day === today) return t(`now.${part}`);
      // A weekday says nothing of what is weeks away.
      return Math.abs(daysBetween(today, day)) < 7
        ? t('dayPart', { day: weekdayName(day, locale), part: t(`part.${part}`) })
        : t('datePart', { day: longDay(day, locale), part: t(`part.${part}`) });
    },
  };
}
