import 'server-only';
import { eq } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { people, pools } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type PoolRow = typeof pools.$inferSelect;
export type PoolChanges = Partial<Omit<typeof pools.$inferInsert, 'householdId'>>;

/** The profile as far as it was answered, with the name of who set the swim limit. */
export async function findPool(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
): Promise<{ pool: PoolRow; swimLimitSetBy: string | null } | null> {
  const [row] = await db
    .select({ pool: pools, swimLimitSetBy: people.name })
    .from(pools)
    .leftJoin(people, eq(people.id, pools.swimLimitSetBy))
    .where(eq(pools.householdId, householdId));
  return row ?? null;
}

export async function updatePool(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  changes: PoolChanges,
): Promise<void> {
  await db.update(pools).set(changes).where(eq(pools.householdId, householdId));
}
