import { useTranslations } from 'next-intl';
import { dayAndMonth, timeOfDay, weekdayName } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import { useReadingSetting } from './reading-setting';

/** When a test was taken: "Sun 12 July, 18:40". */
export function useTimeWords() {
  const t = useTranslations('readings.time');
  const { timeZone, locale } = useReadingSetting();
  return {
    dayAndTime: (instant: number) => {
      const day = dayOf(instant, timeZone);
      return t('dayAndTime', {
        weekday: weekdayName(day, locale, 'short'),
        day: dayAndMonth(day, locale),
        time: timeOfDay(instant, timeZone, locale),
      });
    },
  };
}
