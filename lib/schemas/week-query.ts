import { z } from 'zod';
import { calendarDaySchema } from './time';

/** Which week: the one that holds a day; the week of now when nothing is said. */
export const weekQuerySchema = z.strictObject({ start: calendarDaySchema.optional() });
export type WeekQuery = z.output<typeof weekQuerySchema>;
