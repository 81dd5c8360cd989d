import 'server-only';
import { listOpenInvitations } from '@/db/queries/invitations';
import { listMembers } from '@/db/queries/memberships';
import { safetyCardCounts } from '@/lib/auth/household-access';
import { assertMay, may } from '@/lib/auth/permissions';
import type { HouseholdPeople } from '@/lib/schemas/member';
import type { ServiceContext } from './context';

/** Who belongs to the household, and for owners whoever is invited. */
export async function showPeople({ db, access, now }: ServiceContext): Promise<HouseholdPeople> {
  assertMay(access, 'look');
  const members = await listMembers(db, access.householdId, now);
  const invited = may(access, 'invite') ? await listOpenInvitations(db, access.householdId) : [];
  return {
    members: members.map(({ personId, safetyCardReadAt, handlesChemicals, ...member }) => ({
      ...member,
      you: personId === access.personId,
      handlesChemicals: handlesChemicals && safetyCardCounts(safetyCardReadAt, now),
      cardReadAt: safetyCardReadAt?.toISOString() ?? null,
    })),
    invitations: invited.map(({ createdAt, expiresAt, ...invitation }) => ({
      ...invitation,
      createdAt: createdAt.toISOString(),
      expiresAt: expiresAt.toISOString(),
      expired: expiresAt.getTime() <= now.getTime(),
    })),
  };
}
