import { useTranslations } from 'next-intl';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { longDay, timeOfDay } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';

/** "Sunday 5 July, 19:10": paper hangs for days, so no "today" stands on it. */
export function useMoment(): (instant: number) => string {
  const t = useTranslations('week-print');
  const { timeZone, locale } = useSheet().sheet.household;
  return (instant) =>
    t('moment', { day: longDay(dayOf(instant, timeZone), locale), time: timeOfDay(instant, timeZone, locale) });
}
