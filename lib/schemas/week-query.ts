import { z } from 'zod';
import { calendarDaySchema } from './time';

/** Which week: the one that holds a day; the week of now when nothing is said. */
export const weekQuerySchema = z.strictObject({ start: calendarDaySchema.optional() });
export type WeekQuery = z.output<typeof weekQuerySchema>;

/** What an address says of itself; a day is written by people, too. */
export type WeekAddress = { start?: string | string[] };

/** The week that an address asks for; that of now where it names no day. */
export function weekAskedFor({ start }: WeekAddress): WeekQuery {
  const asked = calendarDaySchema.safeParse(start).data;
  return asked === undefined ? {} : { start: asked };
}
