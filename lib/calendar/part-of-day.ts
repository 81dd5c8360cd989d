import { addDays, type CalendarDay } from './household-day';
import { wallClock, type WallTime, wallToInstant } from './wall-time';

export type PartOfDay = 'night' | 'morning' | 'midday' | 'afternoon' | 'evening';

const morning = { part: 'morning', hourOfDay: 6, time: '06:00' } as const;
/** Where each part begins on the wall clock; before the first one it is still last night. */
const beginnings: readonly { part: PartOfDay; hourOfDay: number; time: WallTime }[] = [
  morning,
  { part: 'midday', hourOfDay: 11, time: '11:00' },
  { part: 'afternoon', hourOfDay: 14, time: '14:00' },
  { part: 'evening', hourOfDay: 17.5, time: '17:30' },
  { part: 'night', hourOfDay: 21.5, time: '21:30' },
];

/** Part of the household's day at an instant [ms]: morning from 6, midday from 11, afternoon from 14, evening from 17:30, night from 21:30. */
export function partOfDay(instant: number, timeZone: string): PartOfDay {
  return partAt(wallClock(instant, timeZone).hourOfDay);
}

/**
 * The part of a day as people say it: 02:00 on Friday is Thursday night. Said as "Friday night" it would promise most of a
 * day too much.
 */
export function spokenPart(instant: number, timeZone: string): { day: CalendarDay; part: PartOfDay } {
  const { day, hourOfDay } = wallClock(instant, timeZone);
  return { day: hourOfDay < morning.hourOfDay ? addDays(day, -1) : day, part: partAt(hourOfDay) };
}

/**
 * The first part of a day that begins at an instant or after it: what may be said when something is to be waited for.
 * 23:40 gives the next morning, 06:00 exactly gives that morning.
 */
export function nextPart(instant: number, timeZone: string): { day: CalendarDay; part: PartOfDay; startsAt: number } {
  const today = wallClock(instant, timeZone).day;
  const starting = ({ part, time }: (typeof beginnings)[number], day: CalendarDay) => ({
    day,
    part,
    startsAt: wallToInstant(day, time, timeZone).instant,
  });
  const laterToday = beginnings
    .map((beginning) => starting(beginning, today))
    .find(({ startsAt }) => startsAt >= instant);
  return laterToday ?? starting(morning, addDays(today, 1));
}

function partAt(hourOfDay: number): PartOfDay {
  return beginnings.findLast((beginning) => hourOfDay >= beginning.hourOfDay)?.part ?? 'night';
}
