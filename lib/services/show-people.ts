import 'server-only';
import { listOpenInvitations } from '@/db/queries/invitations';
import { listHouseholdMails } from '@/db/queries/outgoing-mails';
import { listMembers } from '@/db/queries/memberships';
import { safetyCardCounts } from '@/lib/auth/household-access';
import { assertMay, may } from '@/lib/auth/permissions';
import type { HouseholdPeople, Member } from '@/lib/schemas/member';
import type { ServiceContext } from './context';
import { invitationMailFrom } from './mail-invitation';
import { sentMailOf } from './show-account';

/** Who belongs to the household now, in the order in which they came. */
export async function listPeople({ db, access, now }: ServiceContext): Promise<Member[]> {
  assertMay(access, 'look');
  const members = await listMembers(db, access.householdId, now);
  return members.map(({ personId, safetyCardReadAt, handlesChemicals, ...member }) => ({
    ...member,
    you: personId === access.personId,
    handlesChemicals: handlesChemicals && safetyCardCounts(safetyCardReadAt, now),
    cardReadAt: safetyCardReadAt?.toISOString() ?? null,
  }));
}

/** The same, and for owners whoever is invited. */
export async function showPeople(context: ServiceContext): Promise<HouseholdPeople> {
  const { db, access, now } = context;
  const members = await listPeople(context);
  const invites = may(access, 'invite');
  const invited = invites ? await listOpenInvitations(db, access.householdId) : [];
  const mails = invites ? await listHouseholdMails(db, access.householdId) : [];
  const mailOf = (id: string) => mails.find(({ subjectId }) => subjectId === id);
  return {
    members,
    mailFrom: invites ? await invitationMailFrom(db, access.personId) : 'nowhere',
    invitations: invited.map(({ createdAt, expiresAt, ...invitation }) => ({
      ...invitation,
      mail: sentMailOf(mailOf(invitation.id)),
      createdAt: createdAt.toISOString(),
      expiresAt: expiresAt.toISOString(),
      expired: expiresAt.getTime() <= now.getTime(),
    })),
  };
}
