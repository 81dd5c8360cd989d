import { z } from 'zod';
import { readingKinds, readingMethods, waterLooks } from '@/lib/schemas/reading-kinds';
import { entryQuantities, padQuantities } from './quantities';

const intervalSchema = z.object({ low: z.number(), high: z.number() });

/**
 * A test while it is written down. Its id is made when the form opens: pressing twice, reloading and sending again are all
 * the same test.
 */
export const testDraftSchema = z.object({
  id: z.uuid(),
  kind: z.enum(readingKinds),
  method: z.enum(readingMethods),
  /** Day and wall time when it was not just now. */
  time: z.object({ day: z.string(), time: z.string() }).nullable(),
  look: z.enum(waterLooks),
  /** Read from the strip: one step, or from one step to the next. */
  strip: z.partialRecord(z.enum(padQuantities), intervalSchema),
  /** Typed from a kit or a slip; the temperature of every method. */
  typed: z.partialRecord(z.enum(entryQuantities), z.string()),
  system: z.enum(['metric', 'us']),
  /** Rare values of which somebody said that they are right, each with its quantity. */
  confirmed: z.array(z.string()),
  zeroAnswer: z.enum(['flashed', 'stayed-pale', 'later']).nullable(),
  /** The reading of free chlorine that the answer is about. */
  zeroFor: z.string(),
  /** It stands on the server already and is being corrected. */
  correcting: z.boolean(),
});
export type TestDraft = z.infer<typeof testDraftSchema>;
