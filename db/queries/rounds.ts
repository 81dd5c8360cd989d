import 'server-only';
import { and, desc, eq, isNotNull } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { people, rounds } from '@/db/schema';
import type { RoundItem } from '@/lib/schemas/round-items';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

type NewRow = Omit<typeof rounds.$inferInsert, 'householdId'> & { householdId: ProvenHouseholdId };

/** Writes a round down; false when one of this id is there already, in this household or another. */
export async function insertRound(tx: Transaction, row: NewRow): Promise<boolean> {
  const written = await tx.insert(rounds).values(row).onConflictDoNothing().returning({ id: rounds.id });
  return written.length > 0;
}

/** Whether a round of this id is this household's. */
export async function hasRound(
  tx: Transaction,
  { householdId, id }: { householdId: ProvenHouseholdId; id: string },
): Promise<boolean> {
  const found = await tx
    .select({ id: rounds.id })
    .from(rounds)
    .where(and(eq(rounds.householdId, householdId), eq(rounds.id, id)));
  return found.length > 0;
}

export type StoredRound = { doneAt: Date; doneBy: string | null; exceptions: RoundItem[] };

export async function findLastRound(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
): Promise<StoredRound | undefined> {
  const [round] = await db
    .select({ doneAt: rounds.doneAt, doneBy: people.name, exceptions: rounds.exceptions })
    .from(rounds)
    .leftJoin(people, eq(people.id, rounds.doneBy))
    .where(eq(rounds.householdId, householdId))
    .orderBy(desc(rounds.doneAt))
    .limit(1);
  return round;
}

/** The pressure of the clean filter as it was last written down [bar]. */
export async function findCleanPressure(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
): Promise<number | null> {
  const [round] = await db
    .select({ cleanPressure: rounds.cleanPressure })
    .from(rounds)
    .where(and(eq(rounds.householdId, householdId), isNotNull(rounds.cleanPressure)))
    .orderBy(desc(rounds.doneAt))
    .limit(1);
  return round?.cleanPressure ?? null;
}
