import { dayWithYear, timeOfDay } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import type { HouseholdSetting } from './household-setting';

/** The household's day of an instant, with its year. */
export function dayIn({ timeZone, locale }: HouseholdSetting, instant: string): string {
  return dayWithYear(dayOf(Date.parse(instant), timeZone), locale);
}

/** The household's time of day of an instant. */
export function timeIn({ timeZone, locale }: HouseholdSetting, instant: string): string {
  return timeOfDay(Date.parse(instant), timeZone, locale);
}
