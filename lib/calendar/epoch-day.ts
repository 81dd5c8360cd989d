import { AppError } from '@/lib/errors';

/** A calendar day as the household lives it, "2026-03-29". Not an instant. */
export type CalendarDay = string;

export const MILLISECONDS_PER_DAY = 86_400_000;

const shape = /^\d{4}-\d{2}-\d{2}$/;

/**
 * Number of the day in the proleptic Gregorian calendar, 1970-01-01 being 0: for arithmetic between days, never a time.
 *
 * Range: years 0000 to 9999. Error: `invalid-input` when the text is no day of the calendar (30 February included).
 */
export function epochDayOf(day: CalendarDay): number {
  const milliseconds = shape.test(day) ? Date.parse(`${day}T00:00:00Z`) : Number.NaN;
  // Some engines read "2026-02-30" as 2 March, so the way back has to give the same date.
  if (Number.isNaN(milliseconds) || new Date(milliseconds).getUTCDate() !== Number(day.slice(8)))
    throw new AppError('invalid-input', `"${day}" is not a calendar day.`);
  return milliseconds / MILLISECONDS_PER_DAY;
}

/** Inverse of `epochDayOf`. Error: `invalid-input` outside the years 0000 to 9999. */
export function dayOfEpochDay(epochDay: number): CalendarDay {
  const milliseconds = epochDay * MILLISECONDS_PER_DAY;
  if (!(Math.abs(milliseconds) <= 8.64e15))
    throw new AppError('invalid-input', `Day number ${epochDay} is out of range.`);
  const text = new Date(milliseconds).toISOString();
  if (text.length !== 24) throw new AppError('invalid-input', `Day number ${epochDay} is out of range.`);
  return text.slice(0, 10);
}

export function isCalendarDay(text: string): text is CalendarDay {
  return shape.test(text) && new Date(`${text}T00:00:00Z`).getUTCDate() === Number(text.slice(8));
}
