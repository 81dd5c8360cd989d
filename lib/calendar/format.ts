import type { CalendarDay } from './household-day';
import { epochDayOf, MILLISECONDS_PER_DAY } from './epoch-day';
import { type WallTime, wallTimeOf } from './wall-time';

/** Days and times as people read them. Words around them ("today", "until") belong to the messages. */

/** 'Mon', 'Monday' or 'M'. */
export function weekdayName(day: CalendarDay, locale: string, length: 'long' | 'short' | 'narrow' = 'long'): string {
  return formatted(day, locale, { weekday: length });
}

/** Head of a day-column, 'Mon 6'. The weekday comes first everywhere: the columns are found by it. */
export function dayHeading(day: CalendarDay, locale: string): string {
  return `${weekdayName(day, locale, 'short')} ${Number(day.slice(8))}`;
}

/** '6 July', in American English 'July 6'. */
export function dayAndMonth(day: CalendarDay, locale: string, month: 'long' | 'short' = 'long'): string {
  return formatted(day, locale, { day: 'numeric', month });
}

/** 'Sunday 12 July', in American English 'Sunday, July 12'. */
export function longDay(day: CalendarDay, locale: string): string {
  return formatted(day, locale, { weekday: 'long', day: 'numeric', month: 'long' });
}

/** '12 July 2026': for records that are kept over years. */
export function dayWithYear(day: CalendarDay, locale: string): string {
  return formatted(day, locale, { day: 'numeric', month: 'long', year: 'numeric' });
}

/**
 * '6 to 12 July', '29 June to 5 July', 'July 6 to 12'.
 *
 * @param joiner the word between the two days, from the messages
 */
export function dayRange(from: CalendarDay, to: CalendarDay, locale: string, joiner: string): string {
  const parts = formatter(locale, { day: 'numeric', month: 'long' }).formatRangeToParts(noon(from), noon(to));
  const secondDay = parts.findIndex(({ source }) => source === 'endRange');
  return plainSpaces(parts.map(({ value }, index) => (index === secondDay - 1 ? ` ${joiner} ` : value)).join(''));
}

/** '19:40', where the locale counts twice to twelve '7:40 PM'. */
export function timeOfDay(instant: number, timeZone: string, locale: string): string {
  return wallTimeText(wallTimeOf(instant, timeZone), locale);
}

/** The same for a wall time as it is kept, '19:40'. */
export function wallTimeText(time: WallTime, locale: string): string {
  const clock = formatter(locale, { hour: 'numeric', minute: '2-digit' });
  const hourCycle = clock.resolvedOptions().hourCycle;
  if (hourCycle === 'h23' || hourCycle === 'h24') return time;
  return plainSpaces(clock.format(Date.parse(`1970-01-01T${time}:00Z`)));
}

function formatted(day: CalendarDay, locale: string, options: Intl.DateTimeFormatOptions): string {
  return plainSpaces(formatter(locale, options).format(noon(day)));
}

/** A day is formatted as noon in UTC by a format that counts in UTC, so no zone can move it. */
function noon(day: CalendarDay): number {
  return (epochDayOf(day) + 0.5) * MILLISECONDS_PER_DAY;
}

/** Runtimes put different kinds of space before 'PM'; what the server wrote must not differ from what the browser writes. */
function plainSpaces(text: string): string {
  return text.replace(/[\u00a0\u2009\u202f]/g, ' ');
}

const formatters = new Map<string, Intl.DateTimeFormat>();

function formatter(locale: string, options: Intl.DateTimeFormatOptions): Intl.DateTimeFormat {
  const key = `${locale} ${JSON.stringify(options)}`;
  const known = formatters.get(key);
  if (known) return known;
  const made = new Intl.DateTimeFormat(locale, { ...options, timeZone: 'UTC', calendar: 'gregory' });
  formatters.set(key, made);
  return made;
}
