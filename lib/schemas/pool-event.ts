import { z } from 'zod';
import { instantSchema } from './time';

/**
 * What can happen to a pool that ends a verdict (care rules, part 2). A storm, a failure of pump or power, and a cover that
 * comes off after a week are over with the next test; a drain cover that is not whole only when somebody says so.
 */
export const poolEventKinds = ['storm', 'pump-failure', 'cover-off', 'drain-cover'] as const;
export type PoolEventKind = (typeof poolEventKinds)[number];

/** The one description of something that happened. The id is made on the device, so that a resend is harmless. */
export const newPoolEventSchema = z.strictObject({
  id: z.uuid(),
  kind: z.enum(poolEventKinds),
  happenedAt: instantSchema,
});
export type NewPoolEvent = z.output<typeof newPoolEventSchema>;

/** An event as the household sees it. */
export const poolEventSchema = z.object({
  id: z.uuid(),
  kind: z.enum(poolEventKinds),
  happenedAt: instantSchema,
  reportedBy: z.string().nullable(),
});
export type PoolEvent = z.infer<typeof poolEventSchema>;
