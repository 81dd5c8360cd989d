import { z } from 'zod';
import { instantSchema } from './time';

/** How far a mail has come. */
export const sentMailSchema = z.object({
  state: z.enum(['waits', 'sent', 'refused', 'given-up']),
  /** What the mail server said when it last refused. */
  refusal: z.string().nullable(),
  /** When it is tried again; null once it is not. */
  nextTryAt: instantSchema.nullable(),
});
export type SentMail = z.infer<typeof sentMailSchema>;
