'use client';

import { useTranslations } from 'next-intl';
import { dayHeading, timeOfDay, weekdayName } from '@/lib/calendar/format';
import { dayOf, daysBetween } from '@/lib/calendar/household-day';
import { nextPart, type PartOfDay, spokenPart } from '@/lib/calendar/part-of-day';
import { instantOf } from './sheet-times';
import { useSheet } from './sheet-context';

/** Times as this household says them. Ahead they are parts of a day, never minutes; only what is to be done has a clock time. */
export function useTimes() {
  const t = useTranslations('week');
  const { sheet, onPaper } = useSheet();
  const { timeZone, locale } = sheet.household;
  const today = dayOf(instantOf(sheet.now), timeZone);

  const partOn = ({ day, part }: { day: string; part: PartOfDay }) =>
    day === today && !onPaper
      ? t(`today.${part}`)
      : t('dayPart', { day: weekdayName(day, locale), part: t(`part.${part}`) });

  return {
    today,
    partName: (part: PartOfDay) => t(`part.${part}`),
    /** Beside a figure, in a place that says that it tells when. */
    partShort: (part: PartOfDay) => t(`partShort.${part}`),
    /** "Thursday evening", "this evening": the part that holds an instant. */
    partAt: (instant: number) => partOn(spokenPart(instant, timeZone)),
    /** The first part that begins at an instant or after it: what may be said of a time to wait for. */
    partAfter: (instant: number) => partOn(nextPart(instant, timeZone)),
    clock: (instant: number) => timeOfDay(instant, timeZone, locale),
    /** "today", "tomorrow", "on Thursday". */
    dayInWords: (instant: number) => {
      const day = dayOf(instant, timeZone);
      const days = daysBetween(today, day);
      if (days === 0 && !onPaper) return t('todayName');
      return days === 1 && !onPaper ? t('tomorrowName') : t('onDay', { day: weekdayName(day, locale) });
    },
    weekday: (instant: number) => weekdayName(dayOf(instant, timeZone), locale),
    heading: (instant: number) => dayHeading(dayOf(instant, timeZone), locale),
    dayOf: (instant: number) => dayOf(instant, timeZone),
  };
}
