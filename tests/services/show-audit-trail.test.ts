import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { auditTrail, people } from '@/db/schema';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { changeMember } from '@/lib/services/change-member';
import { handOver } from '@/lib/services/hand-over';
import { invite } from '@/lib/services/invite';
import { showAuditTrail } from '@/lib/services/show-audit-trail';
import { aHousehold, aMember, freshDatabase } from '@/tests/support/test-database';

const now = new Date('2026-07-05T12:00:00Z');

let db: Database;
let owner: HouseholdAccess;
let member: HouseholdAccess;
beforeEach(async () => {
  db = freshDatabase();
  owner = await aHousehold(db);
  member = await aMember(db, { householdId: owner.householdId, role: 'caretaker', now });
  await db.update(people).set({ name: 'Otto' }).where(eq(people.id, member.personId));
});

const as = (access: HouseholdAccess) => ({ db, access, now });
const written = (personId: string | null) =>
  writeAudit(db, { householdId: owner.householdId, personId, at: now, action: 'record-round' });
const first = async () => (await showAuditTrail(as(owner), {})).entries[0];

describe('the record of who changed what', () => {
  it('names who did it, to whom, and what helps', async () => {
    await changeMember(as(owner), { role: 'caretaker', chemicalsAllowed: false }, { id: member.membershipId });
    expect(await first()).toMatchObject({
      ...{ action: 'change-member', who: { kind: 'person', name: 'Ines' }, member: { kind: 'person', name: 'Otto' } },
      ...{ role: 'caretaker', chemicalsAllowed: false, days: null, at: now.toISOString() },
    });
    const days = { fromDay: '2026-08-03', untilDay: '2026-08-16' };
    const asked = { id: crypto.randomUUID(), memberId: member.membershipId, chemicalsAllowed: true, ...days };
    await handOver(as(owner), asked);
    expect(await first()).toMatchObject({
      ...{ action: 'hand-over', member: { name: 'Otto' }, chemicalsAllowed: true },
      days: { from: '2026-08-03', until: '2026-08-16' },
    });
    const invitation = { id: crypto.randomUUID(), name: 'Nell', role: 'viewer' as const, chemicalsAllowed: false };
    await invite(as(owner), invitation);
    expect(await first()).toMatchObject({ action: 'invite', named: 'Nell', role: 'viewer', member: null });
  });

  it('tells no ids', async () => {
    const invitation = { id: crypto.randomUUID(), name: 'Nell', role: 'viewer' as const, chemicalsAllowed: false };
    await invite(as(owner), invitation);
    await changeMember(as(owner), { role: 'viewer', chemicalsAllowed: false }, { id: member.membershipId });
    const told = JSON.stringify(await showAuditTrail(as(owner), {}));
    expect(told).not.toMatch(/[0-9a-f]{8}-[0-9a-f]{4}/);
  });

  it('calls nobody the server, and whoever gave their account up a former member', async () => {
    await written(null);
    expect(await first()).toMatchObject({ who: { kind: 'server' } });
    await written(member.personId);
    expect(await first()).toMatchObject({ who: { kind: 'person', name: 'Otto' } });
    await changeMember(as(owner), { role: 'viewer', chemicalsAllowed: false }, { id: member.membershipId });
    await db.update(people).set({ deletedAt: now, name: 'gone' }).where(eq(people.id, member.personId));
    const { entries } = await showAuditTrail(as(owner), {});
    expect(entries.map(({ who, member: to }) => [who.kind, to?.kind])).toEqual([
      ['person', 'former'],
      ['former', undefined],
      ['server', undefined],
    ]);
    expect(JSON.stringify(entries)).not.toContain('gone');
  });

  it('comes fifty at a time, newest first, each once', async () => {
    for (let count = 0; count < 101; count += 1) await written(owner.personId);
    const ids: number[] = [];
    const sizes: number[] = [];
    let before: string | undefined;
    do {
      const page = await showAuditTrail(as(owner), { before });
      sizes.push(page.entries.length);
      ids.push(...page.entries.map(({ id }) => id));
      before = page.before ?? undefined;
    } while (before !== undefined);
    expect(sizes).toEqual([50, 50, 1]);
    const all = (await db.select({ id: auditTrail.id }).from(auditTrail)).map(({ id }) => id);
    expect(ids).toEqual(all.toSorted((one, other) => other - one));
  });

  it('ends with its last full page where nothing is older', async () => {
    for (let count = 0; count < 50; count += 1) await written(owner.personId);
    expect(await showAuditTrail(as(owner), {})).toMatchObject({ before: null, entries: { length: 50 } });
  });

  it('is for owners of this household', async () => {
    await written(owner.personId);
    await expect(showAuditTrail(as(member), {})).rejects.toMatchObject({ code: 'not-allowed' });
    const theirs = await aHousehold(db);
    expect(await showAuditTrail(as(theirs), {})).toEqual({ entries: [], before: null });
  });
});
