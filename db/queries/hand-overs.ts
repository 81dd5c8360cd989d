import 'server-only';
import { and, asc, eq, gte, isNull } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { handOvers, memberships, people } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import { isMemberAt } from './memberships';

type Of = { householdId: ProvenHouseholdId; id: string };
type NewRow = Omit<typeof handOvers.$inferInsert, 'householdId'> & { householdId: ProvenHouseholdId };

/**
 * Hand-overs that were not taken back, to whoever belongs to the household now, the earliest first.
 *
 * @param since those whose last day is this one or later
 */
export async function listHandOvers(
  db: DatabaseOrTransaction,
  { householdId, since, now }: { householdId: ProvenHouseholdId; since: string; now: Date },
) {
  return db
    .select({
      id: handOvers.id,
      membershipId: handOvers.membershipId,
      name: people.name,
      role: memberships.role,
      safetyCardReadAt: memberships.safetyCardReadAt,
      fromDay: handOvers.fromDay,
      untilDay: handOvers.untilDay,
      chemicalsAllowed: handOvers.chemicalsAllowed,
      agreedAt: handOvers.agreedAt,
    })
    .from(handOvers)
    .innerJoin(memberships, eq(memberships.id, handOvers.membershipId))
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(
      and(
        eq(handOvers.householdId, householdId),
        eq(memberships.householdId, householdId),
        gte(handOvers.untilDay, since),
        isNull(handOvers.endedAt),
        isMemberAt(now),
      ),
    )
    .orderBy(asc(handOvers.fromDay), asc(handOvers.id));
}

/** Writes a hand-over; false when one of this id is there already. */
export async function insertHandOver(tx: Transaction, row: NewRow): Promise<boolean> {
  const written = await tx.insert(handOvers).values(row).onConflictDoNothing().returning({ id: handOvers.id });
  return written.length > 0;
}

/** Whether the household has a hand-over of this id, of whatever time. */
export async function hasHandOver(db: DatabaseOrTransaction, { householdId, id }: Of): Promise<boolean> {
  return (await db.$count(handOvers, and(eq(handOvers.householdId, householdId), eq(handOvers.id, id)))) > 0;
}

export async function setHandOverAgreed(tx: Transaction, { householdId, id, at }: Of & { at: Date }): Promise<void> {
  await tx
    .update(handOvers)
    .set({ agreedAt: at })
    .where(and(eq(handOvers.householdId, householdId), eq(handOvers.id, id)));
}

export async function setHandOverEnded(tx: Transaction, { householdId, id, at }: Of & { at: Date }): Promise<void> {
  await tx
    .update(handOvers)
    .set({ endedAt: at })
    .where(and(eq(handOvers.householdId, householdId), eq(handOvers.id, id)));
}

/** From now on none of a member's hand-overs says that they may handle chemicals. */
export async function takeChemicalsOutOfHandOvers(
  tx: Transaction,
  { householdId, membershipId }: { householdId: ProvenHouseholdId; membershipId: string },
): Promise<void> {
  await tx
    .update(handOvers)
    .set({ chemicalsAllowed: false })
    .where(and(eq(handOvers.householdId, householdId), eq(handOvers.membershipId, membershipId)));
}
