import 'server-only';
import { eq, getTableColumns } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { houseNotes, people } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

type Row = typeof houseNotes.$inferSelect;
export type HouseNoteValues = Omit<Row, 'householdId' | 'updatedAt' | 'updatedBy'>;
export type StoredHouseNotes = Row & { updatedByName: string | null };

export async function findHouseNotes(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
): Promise<StoredHouseNotes | null> {
  const [found] = await db
    .select({ ...getTableColumns(houseNotes), updatedByName: people.name })
    .from(houseNotes)
    .leftJoin(people, eq(people.id, houseNotes.updatedBy))
    .where(eq(houseNotes.householdId, householdId));
  return found ?? null;
}

/** Replaces all notes of a household: what is null is no longer known. */
export async function saveHouseNotes(
  tx: Transaction,
  {
    householdId,
    personId,
    values,
    now,
  }: { householdId: ProvenHouseholdId; personId: string; values: HouseNoteValues; now: Date },
): Promise<void> {
  const row = { ...values, updatedAt: now, updatedBy: personId };
  await tx
    .insert(houseNotes)
    .values({ ...row, householdId })
    .onConflictDoUpdate({ target: houseNotes.householdId, set: row });
}
