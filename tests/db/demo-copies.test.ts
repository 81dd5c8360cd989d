import { randomUUID } from 'node:crypto';
import { describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { countDemoCopies, deleteExpiredDemoCopies, findDemoOriginal, insertHousehold } from '@/db/queries/households';
import { insertMembership } from '@/db/queries/memberships';
import { insertPerson } from '@/db/queries/people';
import { households, people } from '@/db/schema';
import { systemScope } from '@/lib/auth/system-scope';
import { aHousehold, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');
const inHours = (hours: number) => new Date(now.getTime() + hours * 3_600_000);
const scope = systemScope('seed-demo');

async function aDemo(db: Database, expiresAt: Date | null) {
  const [householdId, personId] = [randomUUID(), randomUUID()];
  await insertHousehold(db, scope, {
    ...{ id: householdId, name: 'Demo', timeZone: 'UTC', unitSystem: 'us', locale: 'en' },
    ...{ demo: true, expiresAt, createdAt: now },
  });
  await insertPerson(db, scope, { id: personId, name: 'Visitor', createdAt: now });
  await insertMembership(db, scope, { id: randomUUID(), householdId, personId, role: 'owner', validFrom: now });
  return householdId;
}

describe('copies of the demo household', () => {
  it('go when their day is over, with their visitors; original, other copies and real households stay', async () => {
    const db = freshDatabase();
    await aHousehold(db);
    const original = await aDemo(db, null);
    await aDemo(db, inHours(1));
    await aDemo(db, inHours(24));
    expect(await countDemoCopies(db, scope, now)).toBe(2);
    expect(await deleteExpiredDemoCopies(db, scope, inHours(1))).toBe(1);
    expect(await countDemoCopies(db, scope, inHours(1))).toBe(1);
    expect((await findDemoOriginal(db, scope))?.id).toBe(original);
    expect(await db.$count(households)).toBe(3);
    expect(await db.$count(people)).toBe(3);
  });

  it('have one original', async () => {
    const db = freshDatabase();
    await aDemo(db, null);
    await expect(aDemo(db, null)).rejects.toThrow();
  });
});
