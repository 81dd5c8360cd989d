import { z } from 'zod';
import { situationKindSchema } from './situation';

/** What an open situation asks of the plan: one dose of fast chlorine on the next free evening, and pH before it. */
export const treatmentSchema = z.strictObject({
  kind: situationKindSchema,
  /** Free chlorine to come to, or to raise by [mg/L]; the likely range stays at or under 10. */
  aim: z.union([z.strictObject({ to: z.number().gt(0).max(10) }), z.strictObject({ by: z.number().gt(0).max(10) })]),
  /** A treatment evening may raise to 10 in all; any other one by no more than its cap. */
  evening: z.enum(['treatment', 'ordinary']),
  /** Where pH lies above it, acid first [pH]. */
  pHFirst: z.number().optional(),
});
export type Treatment = z.output<typeof treatmentSchema>;
