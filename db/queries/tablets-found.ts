import 'server-only';
import { and, asc, eq, gte, inArray, isNotNull } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { planDoses, tabletsFound } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

/** Tablets found before doses that really went in, since an instant. */
export async function listTabletsFound(
  db: DatabaseOrTransaction,
  { householdId, from }: { householdId: ProvenHouseholdId; from: Date },
): Promise<{ at: Date; tablets: number }[]> {
  const rows = await db
    .select({ at: planDoses.givenAt, tablets: tabletsFound.tablets })
    .from(tabletsFound)
    .innerJoin(planDoses, eq(planDoses.id, tabletsFound.doseId))
    .where(and(eq(tabletsFound.householdId, householdId), isNotNull(planDoses.givenAt), gte(planDoses.givenAt, from)))
    .orderBy(asc(planDoses.givenAt));
  return rows.flatMap(({ at, tablets }) => (at === null ? [] : [{ at, tablets }]));
}

/** How many were found before each of some doses, where somebody said. */
export async function tabletsFoundBefore(
  db: DatabaseOrTransaction,
  { householdId, doseIds }: { householdId: ProvenHouseholdId; doseIds: readonly string[] },
): Promise<Map<string, number>> {
  const rows = await db
    .select({ doseId: tabletsFound.doseId, tablets: tabletsFound.tablets })
    .from(tabletsFound)
    .where(and(eq(tabletsFound.householdId, householdId), inArray(tabletsFound.doseId, [...doseIds])));
  return new Map(rows.map(({ doseId, tablets }) => [doseId, tablets]));
}

/** A dose that was taken back found nothing. */
export async function deleteTabletsFound(
  tx: Transaction,
  { householdId, doseId }: { householdId: ProvenHouseholdId; doseId: string },
): Promise<void> {
  await tx.delete(tabletsFound).where(and(eq(tabletsFound.householdId, householdId), eq(tabletsFound.doseId, doseId)));
}

/** Keeps what was found; the newest count of a dose is the one that holds. */
export async function saveTabletsFound(
  tx: Transaction,
  found: { householdId: ProvenHouseholdId; doseId: string; tablets: number },
): Promise<void> {
  await tx
    .insert(tabletsFound)
    .values(found)
    .onConflictDoUpdate({ target: tabletsFound.doseId, set: { tablets: found.tablets } });
}
