import { z } from 'zod';
import { calendarDaySchema, instantSchema } from './time';
import { roles } from './week-sheet';

/**
 * All that is written into the record of who changed what, each a verb and a noun, as its service is called. One that was
 * ever written stays on the list: the record is kept for years, and each has its words in every language.
 */
export const auditActions = [
  'add-photo',
  'agree-hand-over',
  'answer-situation',
  'change-member',
  'confirm-stop',
  'count-stock',
  'decline-hand-over',
  'delete-reading',
  'edit-reading',
  'end-pool-event',
  'end-situation',
  'forget-learnt',
  'hand-over',
  'invite',
  'invite-again',
  'join',
  'leave',
  'open-situation',
  'put-back-try-out',
  'read-safety-card',
  'record-reading',
  'record-round',
  'record-visit',
  'remove-member',
  'remove-photo',
  'remove-shelf-product',
  'report-pool-event',
  'save-house-notes',
  'save-household',
  'save-pool',
  'save-shelf-product',
  'take-back-hand-over',
  'take-try-out',
  'tick-dose',
  'tick-situation',
  'uninvite',
] as const;
export type AuditAction = (typeof auditActions)[number];

/** Somebody who did something: by name, the server itself, or somebody whose account is gone. */
const actorSchema = z.discriminatedUnion('kind', [
  z.object({ kind: z.literal('person'), name: z.string() }),
  z.object({ kind: z.literal('server') }),
  z.object({ kind: z.literal('former') }),
]);
export type AuditActor = z.infer<typeof actorSchema>;

const auditEntrySchema = z.object({
  id: z.int(),
  at: instantSchema,
  who: actorSchema,
  action: z.enum(auditActions),
  /** The member that it was done to, where it was one. */
  member: actorSchema.nullable(),
  /** What else helps to know which it was; never an id. */
  named: z.string().nullable(),
  role: z.enum(roles).nullable(),
  chemicalsAllowed: z.boolean().nullable(),
  days: z.object({ from: calendarDaySchema, until: calendarDaySchema }).nullable(),
});
export type AuditEntryShown = z.infer<typeof auditEntrySchema>;

/** One page of the record, newest first. */
export const auditPageSchema = z.object({
  entries: z.array(auditEntrySchema),
  /** To ask for what is older; null at the end of the record. */
  before: z.string().nullable(),
});
export type AuditPage = z.infer<typeof auditPageSchema>;

/** Only what is older than the entry of this id. */
export const auditQuerySchema = z.strictObject({
  before: z
    .string()
    .regex(/^[1-9]\d{0,14}$/, 'Ask for what is older than an entry by its number.')
    .optional(),
});
