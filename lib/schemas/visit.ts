import { z } from 'zod';
import { calendarDaySchema } from './time';

const MOST_IN_A_NOTE = 500;
/** How many of the newest are shown. */
export const VISITS_SHOWN = 5;

/** The one description of a professional's visit. The id is made on the device. */
export const newVisitSchema = z.strictObject({
  id: z.uuid(),
  visitedOn: calendarDaySchema,
  note: z
    .string()
    .trim()
    .min(1, 'Write something, or leave it empty.')
    .max(MOST_IN_A_NOTE, `Keep the note to ${MOST_IN_A_NOTE} characters.`)
    .optional(),
});
export type NewVisit = z.output<typeof newVisitSchema>;

/** The newest visits, the last one first. */
export const visitsSchema = z.array(
  z.object({
    id: z.uuid(),
    visitedOn: calendarDaySchema,
    note: z.string().nullable(),
    recordedBy: z.string().nullable(),
  }),
);
export type Visits = z.infer<typeof visitsSchema>;
