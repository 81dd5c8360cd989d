import { z } from 'zod';

/** How a household weighs money, evenings and steadiness; 1 is the usual weight. */
export const preferencesSchema = z.strictObject({
  /** Evenings on which anything goes in, loading tablets included. */
  visits: z.number().int().min(1).max(7).default(3),
  money: z.number().min(0).max(3).default(1),
  evenings: z.number().min(0).max(3).default(1),
  steadiness: z.number().min(0).max(3).default(1),
  /** Substances, forms or shelf ids that are not to be planned. */
  avoid: z.array(z.string().max(64)).max(30).default([]),
});
export type Preferences = z.output<typeof preferencesSchema>;
