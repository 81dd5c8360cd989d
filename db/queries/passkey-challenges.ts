import 'server-only';
import { and, eq, gt, isNull, lte } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { passkeyChallenges } from '@/db/schema';
import type { SystemScope } from '@/lib/schemas/scope';

export async function insertPasskeyChallenge(
  tx: Transaction,
  row: typeof passkeyChallenges.$inferInsert,
): Promise<void> {
  await tx.insert(passkeyChallenges).values(row);
}

/**
 * Uses a challenge up, in one statement: of two answers at once one is first. False when it is used, over, unknown, or
 * was made for something else; `personId` is null for signing in.
 */
export async function consumePasskeyChallenge(
  db: DatabaseOrTransaction,
  { digest, personId, now }: { digest: string; personId: string | null; now: Date },
): Promise<boolean> {
  const forWhom = personId === null ? isNull(passkeyChallenges.personId) : eq(passkeyChallenges.personId, personId);
  const used = await db
    .delete(passkeyChallenges)
    .where(and(eq(passkeyChallenges.digest, digest), forWhom, gt(passkeyChallenges.expiresAt, now)))
    .returning({ digest: passkeyChallenges.digest });
  return used.length > 0;
}

export async function deleteExpiredPasskeyChallenges(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  now: Date,
): Promise<void> {
  await db.delete(passkeyChallenges).where(lte(passkeyChallenges.expiresAt, now));
}
