import { z } from 'zod';
import { recordedReadingSchema } from './reading';
import { instantSchema } from './time';

/** Which readings: taken from an instant up to but not including another; the last 60 days when nothing is said. */
export const readingListQuerySchema = z.strictObject({
  from: instantSchema.optional(),
  until: instantSchema.optional(),
});
export type ReadingListQuery = z.output<typeof readingListQuerySchema>;

/** Newest first. */
export const readingListSchema = z.array(recordedReadingSchema);
