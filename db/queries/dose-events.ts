import 'server-only';
import { and, eq, gt, inArray, ne } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { doseEvents, planDoses } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

/** Whether a tick with this id was recorded, at whichever dose it ended. */
export async function wasTickRecorded(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  id: string,
): Promise<boolean> {
  const rows = await db
    .select({ id: doseEvents.id })
    .from(doseEvents)
    .where(and(eq(doseEvents.householdId, householdId), eq(doseEvents.id, id)));
  return rows.length > 0;
}

/** Whether since an instant one person skipped a dose that another one ticked as added: nobody can tell what is in the water. */
export async function isATickInDoubt(
  db: DatabaseOrTransaction,
  { householdId, since }: { householdId: ProvenHouseholdId; since: Date },
): Promise<boolean> {
  const rows = await db
    .select({ id: planDoses.id })
    .from(planDoses)
    .innerJoin(doseEvents, and(eq(doseEvents.householdId, planDoses.householdId), eq(doseEvents.doseId, planDoses.id)))
    .where(
      and(
        eq(planDoses.householdId, householdId),
        inArray(planDoses.status, ['given', 'changed']),
        gt(planDoses.givenAt, since),
        eq(doseEvents.action, 'skipped'),
        ne(doseEvents.recordedBy, planDoses.recordedBy),
      ),
    )
    .limit(1);
  return rows.length > 0;
}
