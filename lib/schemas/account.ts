import { z } from 'zod';
import { isTimeZone } from '@/lib/calendar/wall-time';
import { linkTokenSchema, openedLinkSchema } from './account-link';
import { emailSchema } from './email';
import { nameSchemaOf } from './name';
import { sentMailSchema } from './sent-mail';
import { timeZoneSchema } from './time';
import { unitSystems } from './week-sheet';

const personNameSchema = nameSchemaOf('Write your name.');
export const householdNameSchema = nameSchemaOf('Write what you call the pool or the house.');

export const knownTimeZoneSchema = timeZoneSchema.refine(isTimeZone, 'Choose a time zone such as America/New_York.');
export const localeSchema = z
  .string()
  .max(35)
  .regex(/^[A-Za-z]{2,3}(-[A-Za-z0-9]{1,8})*$/, 'Choose a language such as en-US.');
export const unitSystemSchema = z.enum(unitSystems, { error: 'Choose metric or US units.' });

export const shortestPassword = 10;
/** Longer ones only cost time to digest. */
const longestPassword = 200;

const newPasswordSchema = z
  .string({ error: 'Choose a password.' })
  .min(shortestPassword, `Use at least ${shortestPassword} characters. A few words in a row are easy to keep in mind.`)
  .max(longestPassword, `Use at most ${longestPassword} characters.`);

export const signUpSchema = z.strictObject({
  name: personNameSchema,
  email: emailSchema,
  password: newPasswordSchema,
  householdName: householdNameSchema,
  timeZone: knownTimeZoneSchema,
  unitSystem: unitSystemSchema,
  locale: localeSchema,
});
export type SignUp = z.output<typeof signUpSchema>;

/** Somebody who was invited signs up without a household of their own. */
export const invitedSignUpSchema = signUpSchema
  .pick({ name: true, email: true, password: true, locale: true })
  .extend({ token: linkTokenSchema });
export type InvitedSignUp = z.output<typeof invitedSignUpSchema>;

/** Asked before what cannot be taken back: a device left open is not enough. */
export const currentPasswordSchema = z
  .string({ error: 'Write the password you have now.' })
  .min(1, 'Write the password you have now.')
  .max(longestPassword, `A password has at most ${longestPassword} characters.`);

/** Whoever changes the password shows that they know it. */
export const passwordChangeSchema = z.strictObject({
  current: currentPasswordSchema,
  password: newPasswordSchema,
});
export type PasswordChange = z.output<typeof passwordChangeSchema>;

export const emailChangeSchema = z.strictObject({ current: currentPasswordSchema, email: emailSchema });
export type EmailChange = z.output<typeof emailChangeSchema>;

/** Somebody has forgotten their password. */
export const resetRequestSchema = z.strictObject({ email: emailSchema });
export type ResetRequest = z.output<typeof resetRequestSchema>;

/** And holds the link that was sent to them. */
export const passwordResetSchema = openedLinkSchema.extend({ password: newPasswordSchema });
export type PasswordReset = z.output<typeof passwordResetSchema>;

/** What whoever is signed in sees of their account. */
export const shownAccountSchema = z.object({
  /** Null for the visitor of a demo household. */
  email: z.string().nullable(),
  confirmed: z.boolean(),
  /** The address it changes to once that is confirmed. */
  awaited: z.string().nullable(),
  /** How far the newest mail about the account has come. */
  mail: sentMailSchema.nullable(),
  /** Whether this server sends mail at all. */
  sendsMail: z.boolean(),
});
export type ShownAccount = z.output<typeof shownAccountSchema>;

export const signInSchema = z.strictObject({
  email: emailSchema,
  password: z
    .string({ error: 'Write your password.' })
    .min(1, 'Write your password.')
    .max(longestPassword, `A password has at most ${longestPassword} characters.`),
});
export type SignIn = z.output<typeof signInSchema>;

export const householdFates = ['deleted', 'left', 'blocked'] as const;

/** What deleting an account would do to each household of the person. */
export const deletionPreviewSchema = z.object({
  households: z.array(
    z.object({
      id: z.string(),
      name: z.string(),
      /** `blocked`: its last owner goes, and others belong to it. */
      fate: z.enum(householdFates),
      /** How many belong to it beside the person. */
      others: z.number(),
    }),
  ),
});
export type DeletionPreview = z.output<typeof deletionPreviewSchema>;

export const accountDeletionSchema = z.strictObject({
  password: currentPasswordSchema,
  /** The households of which the person was told that they are deleted: no other one is. */
  deletes: z.array(z.string().min(1).max(64)).max(1_000),
});
export type AccountDeletion = z.output<typeof accountDeletionSchema>;

/** Where somebody who just came in goes next: an address of our own. */
export const enteredSchema = z.object({ next: z.string().startsWith('/') });
export type Entered = z.output<typeof enteredSchema>;

export const doneSchema = z.object({ done: z.literal(true) });
export type Done = z.output<typeof doneSchema>;
