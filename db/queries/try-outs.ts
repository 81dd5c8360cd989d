import 'server-only';
import { and, asc, eq, gte, isNull } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { people, tryOuts } from '@/db/schema';
import type { FormerDay } from '@/db/schema/try-outs';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type StoredTryOut = Omit<typeof tryOuts.$inferSelect, 'householdId' | 'takenBy' | 'putBackBy'> & {
  takenBy: string | null;
};
type NewRow = Omit<typeof tryOuts.$inferInsert, 'householdId' | 'takenBy' | 'putBackAt' | 'putBackBy'> & {
  householdId: ProvenHouseholdId;
  personId: string;
};

const columns = {
  id: tryOuts.id,
  takenAt: tryOuts.takenAt,
  takenBy: people.name,
  readingId: tryOuts.readingId,
  changes: tryOuts.changes,
  wishes: tryOuts.wishes,
  former: tryOuts.former,
  putBackAt: tryOuts.putBackAt,
};

/** Keeps a try-out that was taken; false when one of this id is there already, in this household or another. */
export async function insertTryOut(tx: Transaction, { personId, ...row }: NewRow): Promise<boolean> {
  const written = await tx
    .insert(tryOuts)
    .values({ ...row, takenBy: personId })
    .onConflictDoNothing()
    .returning({ id: tryOuts.id });
  return written.length > 0;
}

export async function findTryOut(
  db: DatabaseOrTransaction,
  { householdId, id }: { householdId: ProvenHouseholdId; id: string },
): Promise<StoredTryOut | null> {
  const [found] = await db
    .select(columns)
    .from(tryOuts)
    .leftJoin(people, eq(people.id, tryOuts.takenBy))
    .where(and(eq(tryOuts.householdId, householdId), eq(tryOuts.id, id)));
  return found ?? null;
}

/** Those taken since an instant that nobody put back, in the order in which they were taken. */
export async function listTakenTryOuts(
  db: DatabaseOrTransaction,
  { householdId, since }: { householdId: ProvenHouseholdId; since: Date },
): Promise<StoredTryOut[]> {
  return db
    .select(columns)
    .from(tryOuts)
    .leftJoin(people, eq(people.id, tryOuts.takenBy))
    .where(and(eq(tryOuts.householdId, householdId), isNull(tryOuts.putBackAt), gte(tryOuts.takenAt, since)))
    .orderBy(asc(tryOuts.takenAt), asc(tryOuts.id));
}

/** What of a try-out's days stood there before it. */
export async function setFormerDays(
  tx: Transaction,
  { householdId, id, former }: { householdId: ProvenHouseholdId; id: string; former: FormerDay[] },
): Promise<void> {
  await tx
    .update(tryOuts)
    .set({ former })
    .where(and(eq(tryOuts.householdId, householdId), eq(tryOuts.id, id)));
}

/** Says that a try-out was put back; one that was before stays as it was. */
export async function markPutBack(
  tx: Transaction,
  { householdId, id, at, personId }: { householdId: ProvenHouseholdId; id: string; at: Date; personId: string },
): Promise<void> {
  await tx
    .update(tryOuts)
    .set({ putBackAt: at, putBackBy: personId })
    .where(and(eq(tryOuts.householdId, householdId), eq(tryOuts.id, id), isNull(tryOuts.putBackAt)));
}
