import { z } from 'zod';
import { openedLinkSchema } from './account-link';
import { emailSchema } from './email';
import { nameSchemaOf } from './name';
import { sentMailSchema } from './sent-mail';
import { instantSchema } from './time';
import { roles } from './week-sheet';

/** Somebody who belongs to a household now. */
export const memberSchema = z.object({
  /** Of the membership, not of the person. */
  id: z.uuid(),
  name: z.string(),
  role: z.enum(roles),
  you: z.boolean(),
  /** An owner says that this is an adult who may handle chemicals. */
  chemicalsAllowed: z.boolean(),
  /** They may, and have read the safety card this season. */
  handlesChemicals: z.boolean(),
  cardReadAt: instantSchema.nullable(),
});
export type Member = z.infer<typeof memberSchema>;

/** Somebody who was asked to join and has not yet. */
export const invitationSchema = z.object({
  id: z.uuid(),
  name: z.string(),
  role: z.enum(roles),
  chemicalsAllowed: z.boolean(),
  /** Where it was sent, and whether it arrived; null when the link is handed over. */
  email: z.string().nullable(),
  mail: sentMailSchema.nullable(),
  createdAt: instantSchema,
  expiresAt: instantSchema,
  expired: z.boolean(),
});
export type Invitation = z.infer<typeof invitationSchema>;

/** Who belongs to a household; whoever is invited is seen by owners only. */
export const householdPeopleSchema = z.object({
  members: z.array(memberSchema),
  invitations: z.array(invitationSchema),
  /** Whether an invitation can go by mail from here, by whoever asks. */
  mailFrom: z.enum(['here', 'after-confirmation', 'nowhere']),
});
export type HouseholdPeople = z.infer<typeof householdPeopleSchema>;

const nameSchema = nameSchemaOf('Write their name.');

const lookOnly = { path: ['chemicalsAllowed'], message: 'Somebody who only looks does not handle chemicals.' };

/** The one description of an invitation. The id is made on the device. */
export const newInvitationSchema = z
  .strictObject({
    id: z.uuid(),
    name: nameSchema,
    /** Where the link goes; without it whoever invites hands it over. */
    email: emailSchema.optional(),
    role: z.enum(roles),
    chemicalsAllowed: z.boolean(),
  })
  .refine(({ role, chemicalsAllowed }) => role !== 'viewer' || !chemicalsAllowed, lookOnly);
export type NewInvitation = z.output<typeof newInvitationSchema>;

/** Who is there now, and the link of an invitation, which is shown this once; null when it went by mail. */
export const sentInvitationSchema = householdPeopleSchema.extend({ link: z.url().nullable() });
export type SentInvitation = z.infer<typeof sentInvitationSchema>;

/** What an owner changes of a member. */
export const memberChangeSchema = z
  .strictObject({ role: z.enum(roles), chemicalsAllowed: z.boolean() })
  .refine(({ role, chemicalsAllowed }) => role !== 'viewer' || !chemicalsAllowed, lookOnly);
export type MemberChange = z.output<typeof memberChangeSchema>;

export const acceptedInvitationSchema = openedLinkSchema;

/** What somebody is told who opens the link of an invitation. */
export type OpenedInvitation =
  | { state: 'open'; householdName: string; invitedBy: string | null; name: string; role: (typeof roles)[number] }
  | { state: 'used' | 'withdrawn' | 'expired' | 'unknown' | 'too-often' };
