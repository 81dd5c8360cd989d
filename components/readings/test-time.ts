import { isCalendarDay } from '@/lib/calendar/household-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import type { TestDraft } from './test-draft-schema';

export type TestTime =
  { takenAt: number; problem: undefined } | { takenAt: undefined; problem: 'unreadable' | 'future' };

/** When the water was tested [ms]: now, or the day and wall time that was given; never later than now. */
export function testTime(time: TestDraft['time'], now: number, timeZone: string): TestTime {
  if (time === null) return { takenAt: now, problem: undefined };
  if (!isCalendarDay(time.day) || !/^\d\d:\d\d$/.test(time.time)) return { takenAt: undefined, problem: 'unreadable' };
  const { instant } = wallToInstant(time.day, time.time, timeZone);
  // A minute of grace: the clock on the wall shows no seconds.
  if (instant > now + 60_000) return { takenAt: undefined, problem: 'future' };
  return { takenAt: Math.min(instant, now), problem: undefined };
}
