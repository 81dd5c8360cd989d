import 'server-only';
import { and, eq } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { planDoses } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

/** Says of a dose who is adding it right now: a claim outlives the plan version in which it was made. */
export async function setClaim(
  db: DatabaseOrTransaction,
  {
    householdId,
    doseId,
    claimedBy,
    claimedAt,
  }: { householdId: ProvenHouseholdId; doseId: string; claimedBy: string; claimedAt: Date },
): Promise<void> {
  await db
    .update(planDoses)
    .set({ claimedBy, claimedAt })
    .where(and(eq(planDoses.householdId, householdId), eq(planDoses.id, doseId)));
}
