import 'server-only';
import type { Transaction } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { takeChemicalsOutOfHandOvers } from '@/db/queries/hand-overs';
import { endMembership, listMembers, updateMember } from '@/db/queries/memberships';
import { inWriteTransaction } from '@/db/write';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { HouseholdPeople, MemberChange } from '@/lib/schemas/member';
import type { Role } from '@/lib/schemas/week-sheet';
import type { ServiceContext } from './context';
import { showPeople } from './show-people';

/**
 * Gives a member another role, and says whether they may handle chemicals: who no longer may does not in a hand-over either.
 * The household keeps an owner.
 */
export async function changeMember(
  context: ServiceContext,
  { role, chemicalsAllowed }: MemberChange,
  { id }: { id: string },
): Promise<HouseholdPeople> {
  const { db, access, now } = context;
  assertMay(access, 'invite');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    const before = await assertOwnedAfter(tx, access, { id, role }, now);
    if (before.chemicalsAllowed && !chemicalsAllowed)
      await takeChemicalsOutOfHandOvers(tx, { householdId, membershipId: id });
    await updateMember(tx, { householdId, id, role, chemicalsAllowed });
    const detail = { role, chemicalsAllowed };
    await writeAudit(tx, { householdId, personId, at: now, action: 'change-member', subjectId: id, detail });
  });
  return showPeople({ db, access: { ...access, role: access.membershipId === id ? role : access.role }, now });
}

/** Ends a membership: one's own by leaving, another's for an owner. What they did stays in the record. */
export async function endMember(context: ServiceContext, { id }: { id: string }): Promise<HouseholdPeople> {
  const { db, access, now } = context;
  const leaves = access.membershipId === id;
  assertMay(access, leaves ? 'look' : 'invite');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    await assertOwnedAfter(tx, access, { id, role: null }, now);
    await endMembership(tx, { householdId, id, at: now });
    const action = leaves ? 'leave' : 'remove-member';
    await writeAudit(tx, { householdId, personId, at: now, action, subjectId: id });
  });
  return leaves ? { members: [], invitations: [], mailFrom: 'nowhere' } : showPeople(context);
}

/**
 * Looked at inside the change: of two owners who demote each other at once, the second is refused. The database has the
 * same rule, in fewer words. @returns the member, as they were before
 */
async function assertOwnedAfter(
  tx: Transaction,
  { householdId }: HouseholdAccess,
  { id, role }: { id: string; role: Role | null },
  now: Date,
): Promise<{ chemicalsAllowed: boolean }> {
  const members = await listMembers(tx, householdId, now);
  const before = members.find((member) => member.id === id);
  if (!before) throw new AppError('not-found', 'This person does not belong to the household, or no longer.');
  const rolesAfter = members.map((member) => (member.id === id ? role : member.role));
  if (!rolesAfter.includes('owner'))
    throw new AppError('conflict', 'A household needs an owner. Make somebody else an owner first.');
  return before;
}
