import 'server-only';
import { eq, lt } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { sessions } from '@/db/schema';
import type { ProvenHouseholdId, SystemScope } from '@/lib/schemas/scope';

/** From now on this device looks at this household. */
export async function chooseSessionHousehold(
  db: DatabaseOrTransaction,
  sessionId: string,
  householdId: ProvenHouseholdId,
): Promise<void> {
  await db.update(sessions).set({ householdId }).where(eq(sessions.id, sessionId));
}

export async function deleteExpiredSessions(db: DatabaseOrTransaction, _scope: SystemScope, now: Date): Promise<void> {
  await db.delete(sessions).where(lt(sessions.expiresAt, Math.floor(now.getTime() / 1000)));
}
