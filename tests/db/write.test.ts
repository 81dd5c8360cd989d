import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import { openDatabase } from '@/db/client';
import { rateLimits } from '@/db/schema';
import { inWriteTransaction } from '@/db/write';
import { freshDatabase } from '@/tests/support/test-database';

const expiresAt = new Date('2026-07-05T12:00:00Z');
const aRow = () => ({ key: randomUUID(), points: 1, expiresAt });
const pause = (milliseconds: number) => new Promise((resolve) => setTimeout(resolve, milliseconds));

describe('inWriteTransaction', () => {
  it('commits twenty transactions started at once, each of which waits in the middle', async () => {
    const db = freshDatabase();
    await Promise.all(
      Array.from({ length: 20 }, () =>
        inWriteTransaction(db, async (tx) => {
          const [before] = await tx.select().from(rateLimits).limit(1);
          await pause(2);
          if (before) await tx.update(rateLimits).set({ points: before.points + 1 });
          else await tx.insert(rateLimits).values(aRow());
        }),
      ),
    );
    expect(await db.select({ points: rateLimits.points }).from(rateLimits)).toEqual([{ points: 20 }]);
  });

  it('lets single writes and transactions run side by side', async () => {
    const db = freshDatabase();
    await Promise.all([
      ...Array.from({ length: 20 }, () => db.insert(rateLimits).values(aRow())),
      ...Array.from({ length: 20 }, () =>
        inWriteTransaction(db, async (tx) => {
          await pause(1);
          await tx.insert(rateLimits).values(aRow());
        }),
      ),
    ]);
    expect(await db.$count(rateLimits)).toBe(40);
  });

  it('leaves nothing of a transaction that fails, and goes on with the next', async () => {
    const db = freshDatabase();
    const failing = inWriteTransaction(db, async (tx) => {
      await tx.insert(rateLimits).values(aRow());
      throw new Error('in the middle');
    });
    await expect(failing).rejects.toThrow('in the middle');
    await inWriteTransaction(db, (tx) => tx.insert(rateLimits).values(aRow()));
    expect(await db.$count(rateLimits)).toBe(1);
  });

  it('waits, without blocking the process, until another process lets go of the lock', async () => {
    const db = freshDatabase();
    // A client of its own, whose writes do not take turns with ours: as another process would be.
    const other = openDatabase(db.url).$client;
    const held = await other.transaction('write');
    let beats = 0;
    const heart = setInterval(() => (beats += 1), 20);
    const written = inWriteTransaction(db, (tx) => tx.insert(rateLimits).values(aRow()));
    const single = db.insert(rateLimits).values(aRow());
    await pause(500);
    await held.rollback();
    await written;
    await single;
    clearInterval(heart);
    // A thread that is blocked has no beat at all; one that shares its core with others has fewer than 25.
    expect(beats).toBeGreaterThan(2);
    expect(await db.$count(rateLimits)).toBe(2);
    // The connection that was refused is not left broken.
    await inWriteTransaction(db, (tx) => tx.insert(rateLimits).values(aRow()));
    expect(await db.$count(rateLimits)).toBe(3);
  });

  it('rolls back a transaction that stays open too long', async () => {
    const db = freshDatabase();
    const slow = inWriteTransaction(
      db,
      async (tx) => {
        await tx.insert(rateLimits).values(aRow());
        await pause(300);
      },
      50,
    );
    await expect(slow).rejects.toThrow('open for more than 50 ms');
    await db.insert(rateLimits).values(aRow());
    expect(await db.$count(rateLimits)).toBe(1);
  });
});
