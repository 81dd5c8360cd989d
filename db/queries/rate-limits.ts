import 'server-only';
import { and, eq, gt, lte, sql } from 'drizzle-orm';
import type { DatabaseOrTransaction } from '@/db/client';
import { rateLimits } from '@/db/schema';
import type { SystemScope } from '@/lib/schemas/scope';

/**
 * Takes one point of a fixed window, in one statement: atomic, and it survives a restart.
 *
 * @returns how many points were taken in this window, this one included, and when it ends
 */
export async function takePoint(
  db: DatabaseOrTransaction,
  { key, windowMilliseconds, now }: { key: string; windowMilliseconds: number; now: Date },
): Promise<{ points: number; expiresAt: Date }> {
  const ends = new Date(now.getTime() + windowMilliseconds);
  const isOver = sql`${rateLimits.expiresAt} <= ${now.getTime()}`;
  const [row] = await db
    .insert(rateLimits)
    .values({ key, points: 1, expiresAt: ends })
    .onConflictDoUpdate({
      target: rateLimits.key,
      set: {
        points: sql`case when ${isOver} then 1 else ${rateLimits.points} + 1 end`,
        expiresAt: sql`case when ${isOver} then ${ends.getTime()} else ${rateLimits.expiresAt} end`,
      },
    })
    .returning({ points: rateLimits.points, expiresAt: rateLimits.expiresAt });
  if (!row) throw new Error('A rate limit was neither written nor read.');
  return row;
}

/** How many points were taken in the window that runs, and when it ends. */
export async function countedPoints(
  db: DatabaseOrTransaction,
  { key, now }: { key: string; now: Date },
): Promise<{ points: number; expiresAt: Date }> {
  const [row] = await db
    .select({ points: rateLimits.points, expiresAt: rateLimits.expiresAt })
    .from(rateLimits)
    .where(and(eq(rateLimits.key, key), gt(rateLimits.expiresAt, now)));
  return row ?? { points: 0, expiresAt: now };
}

export async function giveBackPoints(db: DatabaseOrTransaction, key: string): Promise<void> {
  await db.delete(rateLimits).where(eq(rateLimits.key, key));
}

export async function deleteExpiredRateLimits(
  db: DatabaseOrTransaction,
  _scope: SystemScope,
  now: Date,
): Promise<void> {
  await db.delete(rateLimits).where(lte(rateLimits.expiresAt, now));
}
