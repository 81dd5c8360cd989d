import { describe, expect, it } from 'vitest';
import { giveBackPoints, takePoint } from '@/db/queries/rate-limits';
import { freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');
const window = { key: 'sign-in x', windowMilliseconds: 60_000 };

describe('takePoint', () => {
  it('counts twelve at once as twelve', async () => {
    const db = freshDatabase();
    const taken = await Promise.all(Array.from({ length: 12 }, () => takePoint(db, { ...window, now })));
    expect(taken.map(({ points }) => points).sort((a, b) => a - b)).toEqual(
      Array.from({ length: 12 }, (_, at) => at + 1),
    );
  });

  it('starts again when the window is over, and when the points are given back', async () => {
    const db = freshDatabase();
    const at = (seconds: number) => takePoint(db, { ...window, now: new Date(now.getTime() + seconds * 1000) });
    expect((await at(0)).points).toBe(1);
    expect(await at(59)).toEqual({ points: 2, expiresAt: new Date('2026-07-05T12:01:00Z') });
    expect(await at(60)).toEqual({ points: 1, expiresAt: new Date('2026-07-05T12:02:00Z') });
    await giveBackPoints(db, window.key);
    expect((await at(61)).points).toBe(1);
  });
});
