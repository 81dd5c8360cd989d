import 'server-only';
import { and, eq, gt, isNotNull, lte } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { planDoses, plans } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

/**
 * Ids of doses that were due, and neither ticked nor skipped, when a newer plan took over from theirs: nobody knows whether
 * they went in. `since` is the last reading, which has seen what was due before it.
 */
export async function listOvertakenDoseIds(
  db: DatabaseOrTransaction,
  { householdId, since }: { householdId: ProvenHouseholdId; since: Date },
): Promise<string[]> {
  const rows = await db
    .select({ id: planDoses.id })
    .from(planDoses)
    .innerJoin(plans, eq(plans.id, planDoses.planId))
    .where(
      and(
        eq(planDoses.householdId, householdId),
        eq(planDoses.status, 'planned'),
        gt(planDoses.at, since),
        isNotNull(plans.supersededAt),
        lte(planDoses.at, plans.supersededAt),
      ),
    );
  return rows.map(({ id }) => id);
}
