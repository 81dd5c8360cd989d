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
