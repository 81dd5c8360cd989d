import { z } from 'zod';
import { factSchema } from './plan';
import { instantSchema } from './time';

export const verdictStates = ['stay-out', 'wait', 'test-first', 'fine'] as const;

/** The swim verdict at one moment: the worst state that holds, why, and until when. */
export const verdictSchema = z.object({
  state: z.enum(verdictStates),
  /** Codes of lib/verdict/codes.ts with their numbers; those of the state that won come first. */
  reasons: z.array(factSchema),
  /** When it ends (fine) or may end (wait); null when nobody can say. */
  until: instantSchema.nullable(),
  adviseDailyCheck: z.boolean(),
});
