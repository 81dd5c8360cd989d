import 'server-only';
import { and, asc, eq, gt, isNull, lte, ne, or, sql } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { households, memberships, people, pools } from '@/db/schema';
import type { ProvenHouseholdId, SystemScope } from '@/lib/schemas/scope';
import type { Role } from '@/lib/schemas/week-sheet';

export async function insertMembership(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  membership: typeof memberships.$inferInsert,
): Promise<void> {
  await db.insert(memberships).values(membership);
}

/** The households a signed-in person may enter now, oldest membership first. Only the gate and the person's own list ask. */
export async function listValidMemberships(db: DatabaseOrTransaction, personId: string, now: Date) {
  return db
    .select({
      membershipId: memberships.id,
      role: memberships.role,
      chemicalsAllowed: memberships.chemicalsAllowed,
      handlesChemicals: memberships.handlesChemicals,
      safetyCardReadAt: memberships.safetyCardReadAt,
      personName: people.name,
      language: people.language,
      tourClosedAt: people.tourClosedAt,
      household: households,
      poolCompletedAt: pools.completedAt,
    })
    .from(memberships)
    .innerJoin(households, eq(households.id, memberships.householdId))
    .innerJoin(people, eq(people.id, memberships.personId))
    .innerJoin(pools, eq(pools.householdId, memberships.householdId))
    .where(
      and(
        eq(memberships.personId, personId),
        lte(memberships.validFrom, now),
        or(isNull(memberships.validUntil), gt(memberships.validUntil, now)),
        or(isNull(households.expiresAt), gt(households.expiresAt, now)),
      ),
    )
    .orderBy(asc(memberships.validFrom), asc(memberships.id));
}

/** Members of a household who are marked as handling chemicals and belong to it now; when they read the safety card. */
export async function listMarkedHandlers(db: DatabaseOrTransaction, householdId: ProvenHouseholdId, now: Date) {
  return db
    .select({ membershipId: memberships.id, name: people.name, safetyCardReadAt: memberships.safetyCardReadAt })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(
      and(
        eq(memberships.householdId, householdId),
        eq(memberships.handlesChemicals, true),
        ne(memberships.role, 'viewer'),
        lte(memberships.validFrom, now),
        or(isNull(memberships.validUntil), gt(memberships.validUntil, now)),
      ),
    )
    .orderBy(asc(people.name), asc(memberships.id));
}

/** Marks a member as one who handles chemicals, with the moment the safety card was read; null takes the mark away. */
export async function markHandlesChemicals(
  db: DatabaseOrTransaction,
  {
    householdId,
    membershipId,
    cardReadAt,
  }: Record<'householdId', ProvenHouseholdId> & {
    membershipId: string;
    cardReadAt: Date | null;
  },
): Promise<void> {
  await db
    .update(memberships)
    .set(cardReadAt === null ? { handlesChemicals: false } : { handlesChemicals: true, safetyCardReadAt: cardReadAt })
    .where(and(eq(memberships.householdId, householdId), eq(memberships.id, membershipId)));
}

/**
 * Keeps when a member read the safety card. It marks them as handling chemicals where their own role and an owner's word
 * allow that; who may only for the days of a hand-over is not marked, so that nothing of it outlasts them.
 */
export async function keepCardReading(
  tx: Transaction,
  { householdId, membershipId, at }: { householdId: ProvenHouseholdId; membershipId: string; at: Date },
): Promise<void> {
  const { chemicalsAllowed, role } = memberships;
  await tx
    .update(memberships)
    .set({ safetyCardReadAt: at, handlesChemicals: sql`${chemicalsAllowed} and ${role} <> 'viewer'` })
    .where(and(eq(memberships.householdId, householdId), eq(memberships.id, membershipId)));
}

/** Who belongs to a household now, in the order in which they came. */
export async function listMembers(db: DatabaseOrTransaction, householdId: ProvenHouseholdId, now: Date) {
  return db
    .select({
      id: memberships.id,
      personId: memberships.personId,
      name: people.name,
      role: memberships.role,
      chemicalsAllowed: memberships.chemicalsAllowed,
      handlesChemicals: memberships.handlesChemicals,
      safetyCardReadAt: memberships.safetyCardReadAt,
    })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(and(eq(memberships.householdId, householdId), isMemberAt(now)))
    .orderBy(asc(memberships.validFrom), asc(memberships.id));
}

/** Another role, and whether they may handle chemicals; whoever may not any more no longer does. */
export async function updateMember(
  tx: Transaction,
  { householdId, id, role, chemicalsAllowed }: MemberOf & { role: Role; chemicalsAllowed: boolean },
): Promise<void> {
  await tx
    .update(memberships)
    .set({ role, chemicalsAllowed, ...(chemicalsAllowed ? {} : { handlesChemicals: false }) })
    .where(and(eq(memberships.householdId, householdId), eq(memberships.id, id)));
}

/** The membership is over from now on. */
export async function endMembership(tx: Transaction, { householdId, id, at }: MemberOf & { at: Date }): Promise<void> {
  await tx
    .update(memberships)
    .set({ validUntil: at })
    .where(and(eq(memberships.householdId, householdId), eq(memberships.id, id)));
}

type MemberOf = { householdId: ProvenHouseholdId; id: string };

/** A condition: the membership holds at an instant. */
export const isMemberAt = (now: Date) =>
  and(lte(memberships.validFrom, now), or(isNull(memberships.validUntil), gt(memberships.validUntil, now)));
