import 'server-only';
import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { plans } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

/** Leaves the household without a current plan: what it was made from is gone. */
export async function supersedeCurrentPlan(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  now: Date,
): Promise<void> {
  await db
    .update(plans)
    .set({ supersededAt: now })
    .where(and(eq(plans.householdId, householdId), isNull(plans.supersededAt)));
}

/** What some plans were made from. */
export async function listPlanSnapshots(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  planIds: readonly string[],
) {
  const rows = await db
    .select({ snapshot: plans.snapshot })
    .from(plans)
    .where(and(eq(plans.householdId, householdId), inArray(plans.id, [...planIds])));
  return rows.map(({ snapshot }) => snapshot);
}

/** A plan by its number; null when there is none. */
export async function findPlanOfVersion(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  version: number,
): Promise<Pick<
  typeof plans.$inferSelect,
  'createdAt' | 'endsAt' | 'engineVersion' | 'snapshot' | 'readingId' | 'result'
> | null> {
  const [plan] = await db
    .select({
      createdAt: plans.createdAt,
      endsAt: plans.endsAt,
      engineVersion: plans.engineVersion,
      snapshot: plans.snapshot,
      readingId: plans.readingId,
      result: plans.result,
    })
    .from(plans)
    .where(and(eq(plans.householdId, householdId), eq(plans.version, version)));
  return plan ?? null;
}
