import { longDay, timeOfDay } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import type { RoundHousehold } from './round-household';

/** Days and hours of a round, in the household's zone and language. */
export function roundTimes({ timeZone, locale }: Pick<RoundHousehold, 'timeZone' | 'locale'>) {
  const day = (instant: number) => longDay(dayOf(instant, timeZone), locale);
  return { day, full: (instant: number) => `${day(instant)}, ${timeOfDay(instant, timeZone, locale)}` };
}
