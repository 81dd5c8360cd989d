import 'server-only';
import { eq } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { sessions } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

/** That somebody was there on this device. */
export async function markSessionSeen(
  db: DatabaseOrTransaction,
  { sessionId, at }: { sessionId: string; at: Date },
): Promise<void> {
  await db.update(sessions).set({ lastSeenAt: at }).where(eq(sessions.id, sessionId));
}

/** From now on this device looks at this household. */
export async function chooseSessionHousehold(
  db: DatabaseOrTransaction,
  sessionId: string,
  householdId: ProvenHouseholdId,
): Promise<void> {
  await db.update(sessions).set({ householdId }).where(eq(sessions.id, sessionId));
}
