import { type CalendarDay, dayOfEpochDay, epochDayOf, isCalendarDay, MILLISECONDS_PER_DAY } from './epoch-day';
import { readLocalTime } from './local-time';
import { zoneStretch } from './zone-offset';

export { type CalendarDay, isCalendarDay };

/** Monday 1 to Sunday 7, as in ISO 8601. */
export type Weekday = 1 | 2 | 3 | 4 | 5 | 6 | 7;

/**
 * The day a household lives in at an instant.
 *
 * @param instant  milliseconds since 1970-01-01T00:00Z
 * @param timeZone IANA name, e.g. "Europe/Madrid"
 * Errors: `invalid-input` for an unknown zone or a number that is no instant.
 */
export function dayOf(instant: number, timeZone: string): CalendarDay {
  return dayOfEpochDay(epochDayAt(instant, timeZone));
}

/** The number of that day, see `epochDayOf`. */
export function epochDayAt(instant: number, timeZone: string): number {
  return Math.floor((instant + zoneStretch(instant, timeZone).offset) / MILLISECONDS_PER_DAY);
}

/**
 * First instant of a day [ms]. The day after a clock change starts 23 or 25 hours later, so a day's end is always the
 * next day's start, never `start + 24 h`; where clocks change at midnight the day starts at 01:00. A day that a zone left
 * out (Samoa, 30 December 2011) starts where the next one does and has no hours.
 *
 * Errors: `invalid-input` for an unknown zone or what is no day.
 */
export function startOfDay(day: CalendarDay, timeZone: string): number {
  return startOfEpochDay(epochDayOf(day), timeZone);
}

/** The same for a day given by its number, see `epochDayOf`. */
export function startOfEpochDay(epochDay: number, timeZone: string): number {
  const { earlier, gap } = readLocalTime(epochDay * MILLISECONDS_PER_DAY, timeZone);
  return gap ?? earlier;
}

/**
 * The time from the start of a day to the end of another, which may be the same: `from` belongs to it, `until` does not
 * [ms]. Errors: those of {@link startOfDay}.
 */
export function stretchOfDays(
  first: CalendarDay,
  last: CalendarDay,
  timeZone: string,
): { from: number; until: number } {
  return { from: startOfDay(first, timeZone), until: startOfDay(addDays(last, 1), timeZone) };
}

/** Hours between a day's start and the next day's: 24, or 23 and 25 where clocks change (23.5 and 24.5 on Lord Howe). */
export function hoursInDay(day: CalendarDay, timeZone: string): number {
  const { from, until } = stretchOfDays(day, day, timeZone);
  return (until - from) / 3_600_000;
}

export function addDays(day: CalendarDay, days: number): CalendarDay {
  return dayOfEpochDay(epochDayOf(day) + days);
}

/** Days from one day to another; negative when the second comes first. */
export function daysBetween(from: CalendarDay, to: CalendarDay): number {
  return epochDayOf(to) - epochDayOf(from);
}

export function weekday(day: CalendarDay): Weekday {
  // 1970-01-01 was a Thursday.
  return (((((epochDayOf(day) + 3) % 7) + 7) % 7) + 1) as Weekday;
}

/** The seven days of the week that holds a day, beginning with the household's first weekday. */
export function weekOf(day: CalendarDay, firstWeekday: Weekday): CalendarDay[] {
  const start = addDays(day, -((weekday(day) - firstWeekday + 7) % 7));
  return Array.from({ length: 7 }, (_, index) => addDays(start, index));
}
