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

/** The household that a device looks at; null for none, and for a session that is over. */
export async function sessionHousehold(db: DatabaseOrTransaction, sessionId: string): Promise<string | null> {
  const [session] = await db
    .select({ householdId: sessions.householdId })
    .from(sessions)
    .where(eq(sessions.id, sessionId));
  return session?.householdId ?? null;
}

/** From now on this device looks at this household. */
export async function chooseSessionHousehold(
  db: DatabaseOrTransaction,
  sessionId: string,
  householdId: ProvenHouseholdId,
): Promise<void> {
  await db.update(sessions).set({ householdId }).where(eq(sessions.id, sessionId));
}
