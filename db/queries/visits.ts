import 'server-only';
import { and, desc, eq } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { people, visits } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

type NewRow = Omit<typeof visits.$inferInsert, 'householdId'> & { householdId: ProvenHouseholdId };

/** Writes a visit down; false when one of this id is there already, in this household or another. */
export async function insertVisit(tx: Transaction, row: NewRow): Promise<boolean> {
  const written = await tx.insert(visits).values(row).onConflictDoNothing().returning({ id: visits.id });
  return written.length > 0;
}

/** Whether a visit of this id is this household's. */
export async function hasVisit(
  tx: Transaction,
  { householdId, id }: { householdId: ProvenHouseholdId; id: string },
): Promise<boolean> {
  const found = await tx
    .select({ id: visits.id })
    .from(visits)
    .where(and(eq(visits.householdId, householdId), eq(visits.id, id)));
  return found.length > 0;
}

/** The newest day first; of one day what was written down last. */
export async function listVisits(db: DatabaseOrTransaction, householdId: ProvenHouseholdId, most: number) {
  return db
    .select({ id: visits.id, visitedOn: visits.visitedOn, note: visits.note, recordedBy: people.name })
    .from(visits)
    .leftJoin(people, eq(people.id, visits.recordedBy))
    .where(eq(visits.householdId, householdId))
    .orderBy(desc(visits.visitedOn), desc(visits.createdAt), desc(visits.id))
    .limit(most);
}
