import 'server-only';
import { and, eq } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { doseEvents } from '@/db/schema';
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
