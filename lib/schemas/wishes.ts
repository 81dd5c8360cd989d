import { z } from 'zod';
import { givenDoseSchema } from './dose';
import { calendarDaySchema } from './time';

/** What the household wants of its plan beside its preferences; the plan is made around it, within the same limits. */
export const wishesSchema = z.strictObject({
  /** Doses of chlorine that stand as they were wished: the search plans the rest of the week. */
  doses: z.array(givenDoseSchema).max(8).default([]),
  /** Days on which no other chlorine is planned. */
  notOn: z.array(calendarDaySchema).max(8).default([]),
  /** No slow tablets but those among the wished doses. */
  noFurtherTablets: z.boolean().default(false),
});
export type Wishes = z.output<typeof wishesSchema>;
