import { z } from 'zod';

export const instantSchema = z.iso.datetime({
  offset: true,
  error: 'Write a date and time with its offset, like 2026-07-05T19:00:00-04:00.',
});
export const calendarDaySchema = z.iso.date({ error: 'Write a day like 2026-07-05.' });
export const wallTimeSchema = z.string().regex(/^([01]\d|2[0-3]):[0-5]\d$/, 'Write a time of day like 19:40.');
export const timeZoneSchema = z.string().min(1).max(64);
export const wallIntervalSchema = z.strictObject({ from: wallTimeSchema, to: wallTimeSchema });
export type WallInterval = z.infer<typeof wallIntervalSchema>;
