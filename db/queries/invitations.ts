import 'server-only';
import { and, asc, eq, gt, isNull } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { households, invitations, people } from '@/db/schema';
import type { ProvenHouseholdId, SystemScope } from '@/lib/schemas/scope';

type NewRow = Omit<typeof invitations.$inferInsert, 'householdId'> & { householdId: ProvenHouseholdId };
type Of = { householdId: ProvenHouseholdId; id: string };

/** Those that nobody has used and nobody withdrew, the oldest first. */
export async function listOpenInvitations(db: DatabaseOrTransaction, householdId: ProvenHouseholdId) {
  return db
    .select({
      id: invitations.id,
      name: invitations.name,
      email: invitations.email,
      role: invitations.role,
      chemicalsAllowed: invitations.chemicalsAllowed,
      createdAt: invitations.createdAt,
      expiresAt: invitations.expiresAt,
    })
    .from(invitations)
    .where(and(eq(invitations.householdId, householdId), isOpen))
    .orderBy(asc(invitations.createdAt), asc(invitations.id));
}

/** Writes an invitation; false when one of this id is there already. */
export async function insertInvitation(tx: Transaction, row: NewRow): Promise<boolean> {
  const written = await tx.insert(invitations).values(row).onConflictDoNothing().returning({ id: invitations.id });
  return written.length > 0;
}

/** Another link for an open invitation, and another seven days; null where there is none. The link before it is worth nothing. */
export async function renewInvitation(
  tx: Transaction,
  { householdId, id, ...renewed }: Of & { tokenDigest: string; createdAt: Date; expiresAt: Date },
) {
  const [written] = await tx
    .update(invitations)
    .set(renewed)
    .where(and(eq(invitations.householdId, householdId), eq(invitations.id, id), isOpen))
    .returning({ name: invitations.name, email: invitations.email, role: invitations.role });
  return written ?? null;
}

/** Withdraws an open invitation; false where there is none. */
export async function withdrawInvitation(
  tx: Transaction,
  { householdId, id, at }: Of & { at: Date },
): Promise<boolean> {
  const written = await tx
    .update(invitations)
    .set({ withdrawnAt: at, email: null })
    .where(and(eq(invitations.householdId, householdId), eq(invitations.id, id), isOpen))
    .returning({ id: invitations.id });
  return written.length > 0;
}

/** The invitation that a link is for: whoever holds it is meant, so no household is proven yet. */
export async function findInvitation(db: DatabaseOrTransaction, _scope: SystemScope, tokenDigest: string) {
  const [found] = await db
    .select({
      id: invitations.id,
      householdId: invitations.householdId,
      householdName: households.name,
      invitedBy: people.name,
      name: invitations.name,
      role: invitations.role,
      chemicalsAllowed: invitations.chemicalsAllowed,
      expiresAt: invitations.expiresAt,
      usedAt: invitations.usedAt,
      withdrawnAt: invitations.withdrawnAt,
    })
    .from(invitations)
    .innerJoin(households, eq(households.id, invitations.householdId))
    .leftJoin(people, eq(people.id, invitations.createdBy))
    .where(eq(invitations.tokenDigest, tokenDigest));
  return found;
}

/** Uses an invitation up; false when it is used, withdrawn or over: of two at once one is first. */
export async function consumeInvitation(
  tx: Transaction,
  _scope: SystemScope,
  { id, personId, at }: { id: string; personId: string; at: Date },
): Promise<boolean> {
  const written = await tx
    .update(invitations)
    .set({ usedAt: at, usedBy: personId, email: null })
    .where(and(eq(invitations.id, id), isOpen, gt(invitations.expiresAt, at)))
    .returning({ id: invitations.id });
  return written.length > 0;
}

const isOpen = and(isNull(invitations.usedAt), isNull(invitations.withdrawnAt));
