import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { describe, expect, it } from 'vitest';
import { insertHousehold } from '@/db/queries/households';
import { insertMembership } from '@/db/queries/memberships';
import { households, memberships } from '@/db/schema';
import { proveHousehold } from '@/lib/auth/household-access';
import { may, type Permission } from '@/lib/auth/permissions';
import { systemScope } from '@/lib/auth/system-scope';
import { aHousehold, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');
const after = (days: number) => new Date(now.getTime() + days * 86_400_000);

describe('proveHousehold', () => {
  it('proves a membership from its first instant up to, and not at, its last', async () => {
    const db = freshDatabase();
    const { personId, householdId, membershipId } = await aHousehold(db, { role: 'caretaker', now });
    await db
      .update(memberships)
      .set({ validUntil: after(7) })
      .where(eq(memberships.id, membershipId));
    const at = (instant: Date) => proveHousehold(db, { personId, householdId, now: instant });
    await expect(at(new Date(now.getTime() - 1))).rejects.toMatchObject({ code: 'not-allowed' });
    expect((await at(now)).role).toBe('caretaker');
    expect((await at(new Date(after(7).getTime() - 1))).role).toBe('caretaker');
    await expect(at(after(7))).rejects.toMatchObject({ code: 'not-allowed' });
  });

  it('never answers for another household than the one asked for', async () => {
    const db = freshDatabase();
    const { personId, householdId } = await aHousehold(db, { now });
    const theirs = await aHousehold(db, { now });
    const asked = { personId, householdId: theirs.householdId, now };
    await expect(proveHousehold(db, asked)).rejects.toMatchObject({ code: 'not-allowed' });
    expect((await proveHousehold(db, { personId, householdId: null, now })).householdId).toBe(householdId);
  });

  it('counts the safety card for a season', async () => {
    const db = freshDatabase();
    const { personId, householdId } = await aHousehold(db, { handlesChemicals: true, now });
    const at = async (instant: Date) =>
      (await proveHousehold(db, { personId, householdId, now: instant })).handlesChemicals;
    expect(await at(after(364))).toBe(true);
    expect(await at(after(365))).toBe(false);
  });

  it('ends with the day of a demo copy', async () => {
    const db = freshDatabase();
    const { personId } = await aHousehold(db, { now });
    const householdId = randomUUID();
    const scope = systemScope('seed-demo');
    await insertHousehold(db, scope, {
      ...{ id: householdId, name: 'A copy', timeZone: 'UTC', unitSystem: 'us', locale: 'en', createdAt: now },
      ...{ demo: true, expiresAt: after(1) },
    });
    await insertMembership(db, scope, { id: randomUUID(), householdId, personId, role: 'owner', validFrom: now });
    expect((await proveHousehold(db, { personId, householdId, now })).demo).toBe(true);
    await expect(proveHousehold(db, { personId, householdId, now: after(1) })).rejects.toMatchObject({
      code: 'not-allowed',
    });
    expect(await db.$count(households)).toBe(2);
  });
});

describe('permissions', () => {
  const caretaker = { role: 'caretaker', handlesChemicals: false } as const;
  it.each([
    ['enter-tests', true],
    ['count-stock', true],
    ['change-week-ahead', true],
    ['tick-doses', false],
    ['change-pool', false],
    ['change-shelf', false],
    ['change-household', false],
    ['correct-any-test', false],
  ] as const)('of a caretaker who handles no chemicals: %s %s', (permission, allowed) => {
    expect(may(caretaker, permission)).toBe(allowed);
  });

  it('let whoever handles chemicals tick doses, and nobody who only looks', () => {
    expect(may({ ...caretaker, handlesChemicals: true }, 'tick-doses')).toBe(true);
    expect(may({ role: 'owner', handlesChemicals: false }, 'tick-doses')).toBe(false);
    const viewer = { role: 'viewer', handlesChemicals: true } as const;
    const all: Permission[] = ['enter-tests', 'count-stock', 'change-week-ahead', 'tick-doses', 'change-pool', 'plan'];
    expect(all.filter((permission) => may(viewer, permission))).toEqual([]);
    expect(may(viewer, 'look')).toBe(true);
  });
});
