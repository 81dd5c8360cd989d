import { z } from 'zod';
import { GAUGE, roundItems } from './round-items';
import { instantSchema } from './time';

const outside = `A gauge shows ${GAUGE[0]} to ${GAUGE[1]} bar.`;
const pressureSchema = z.number().min(GAUGE[0], outside).max(GAUGE[1], outside);

/** The one description of a round. The id is made on the device; what is not named was fine. */
export const newRoundSchema = z.strictObject({
  id: z.uuid(),
  doneAt: instantSchema,
  exceptions: z
    .array(z.enum(roundItems))
    .max(roundItems.length)
    .refine((items) => new Set(items).size === items.length, 'Each thing is said once.'),
  /** Filter pressure as it stands, and as it was with a clean filter [bar]. */
  pressure: pressureSchema.optional(),
  cleanPressure: pressureSchema.optional(),
});
export type NewRound = z.output<typeof newRoundSchema>;

/** The newest round, and the clean filter's pressure as it was last written down [bar]. */
export const roundsSchema = z.object({
  last: z
    .object({ doneAt: instantSchema, doneBy: z.string().nullable(), exceptions: z.array(z.enum(roundItems)) })
    .nullable(),
  cleanPressure: z.number().nullable(),
});
export type Rounds = z.infer<typeof roundsSchema>;
