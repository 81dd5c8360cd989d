import { z } from 'zod';
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
  createdAt: instantSchema,
  expiresAt: instantSchema,
  expired: z.boolean(),
});
export type Invitation = z.infer<typeof invitationSchema>;

/** Who belongs to a household; whoever is invited is seen by owners only. */
export const householdPeopleSchema = z.object({
  members: z.array(memberSchema),
  invitations: z.array(invitationSchema),
});
export type HouseholdPeople = z.infer<typeof householdPeopleSchema>;

const nameSchema = z
  .string({ error: 'Write their name.' })
  .trim()
  .min(1, 'Write their name.')
  .max(80, 'Keep the name under 80 characters.');

const lookOnly = { path: ['chemicalsAllowed'], message: 'Somebody who only looks does not handle chemicals.' };

/** The one description of an invitation. The id is made on the device. */
export const newInvitationSchema = z
  .strictObject({ id: z.uuid(), name: nameSchema, role: z.enum(roles), chemicalsAllowed: z.boolean() })
  .refine(({ role, chemicalsAllowed }) => role !== 'viewer' || !chemicalsAllowed, lookOnly);
export type NewInvitation = z.output<typeof newInvitationSchema>;

/** Who is there now, and the link of an invitation, which is shown this once. */
export const sentInvitationSchema = householdPeopleSchema.extend({ link: z.url() });
export type SentInvitation = z.infer<typeof sentInvitationSchema>;

/** What an owner changes of a member. */
export const memberChangeSchema = z
  .strictObject({ role: z.enum(roles), chemicalsAllowed: z.boolean() })
  .refine(({ role, chemicalsAllowed }) => role !== 'viewer' || !chemicalsAllowed, lookOnly);
export type MemberChange = z.output<typeof memberChangeSchema>;

/** 32 random bytes in base64url. */
export const invitationTokenSchema = z.string().regex(/^[\w-]{43}$/, 'This link is not whole. Copy all of it.');
export const acceptedInvitationSchema = z.strictObject({ token: invitationTokenSchema });

/** What somebody is told who opens the link of an invitation. */
export type OpenedInvitation =
  | { state: 'open'; householdName: string; invitedBy: string | null; name: string; role: (typeof roles)[number] }
  | { state: 'used' | 'withdrawn' | 'expired' | 'unknown' };
