import { beforeAll, describe, expect, it, vi } from 'vitest';
import type { Database } from '@/db/client';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { call, serveFreshDatabase, signedInAs } from '@/tests/support/api';
import { aHousehold, aMember } from '@/tests/support/test-database';

const clock = vi.hoisted(() => ({ now: new Date('2026-07-20T12:00:00Z') }));
vi.mock('@/lib/env', async (original) => ({ ...(await original<object>()), now: () => clock.now }));

const before = (instant: Date) => new Date(instant.getTime() - 1);
// 3 to 16 August 2026 in New York.
const starts = new Date('2026-08-03T04:00:00Z');
const ends = new Date('2026-08-17T04:00:00Z');

describe('a hand-over over HTTP', () => {
  let db: Database;
  let viewer: HouseholdAccess;
  let ownerCookie: string;
  let viewerCookie: string;
  const asked = { id: crypto.randomUUID(), fromDay: '2026-08-03', untilDay: '2026-08-16', chemicalsAllowed: false };
  beforeAll(async () => {
    db = serveFreshDatabase();
    const owner = await aHousehold(db, { now: clock.now });
    const { householdId } = owner;
    viewer = await aMember(db, { householdId, role: 'viewer', now: clock.now });
    ownerCookie = await signedInAs(db, owner);
    viewerCookie = await signedInAs(db, viewer);
  });

  const noteAt = async (instant: Date, cookie = viewerCookie) => {
    clock.now = instant;
    return (await call('PUT', '/api/house-notes', { cookie, body: { gate: 'Key in the shed' } })).status;
  };

  it('lets who only looks change things in its days only, once they agreed', async () => {
    const body = { ...asked, memberId: viewer.membershipId };
    expect((await call('POST', '/api/hand-overs', { cookie: ownerCookie, body })).status).toBe(200);
    expect(await noteAt(starts)).toBe(403);

    clock.now = new Date('2026-07-21T12:00:00Z');
    const path = { id: asked.id };
    const agreement = { cookie: viewerCookie, path, body: { cardRead: false } };
    const agreed = await call('PUT', '/api/hand-overs/[id]/agreement', agreement);
    expect(await agreed.json()).toMatchObject({ handOvers: [{ you: true, agreedAt: clock.now.toISOString() }] });

    expect(await noteAt(before(starts))).toBe(403);
    expect(await noteAt(starts)).toBe(200);
    expect(await noteAt(before(ends))).toBe(200);
    expect(await noteAt(ends)).toBe(403);
  });

  it('leaves the rest to owners, also in its days', async () => {
    clock.now = starts;
    const cookie = viewerCookie;
    const body = { ...asked, id: crypto.randomUUID(), memberId: viewer.membershipId };
    expect((await call('POST', '/api/hand-overs', { cookie, body })).status).toBe(403);
    expect((await call('GET', '/api/audit-trail', { cookie })).status).toBe(403);
    expect(await noteAt(starts, ownerCookie)).toBe(200);
  });

  it('taken back is over at once', async () => {
    clock.now = starts;
    const path = { id: asked.id };
    expect((await call('DELETE', '/api/hand-overs/[id]', { cookie: ownerCookie, path })).status).toBe(200);
    expect(await noteAt(starts)).toBe(403);
    expect((await call('DELETE', '/api/hand-overs/[id]', { cookie: ownerCookie, path })).status).toBe(404);
  });

  it('says at the field what is wrong with the days', async () => {
    const body = { ...asked, memberId: viewer.membershipId, untilDay: '2026-08-02' };
    const refused = await call('POST', '/api/hand-overs', { cookie: ownerCookie, body });
    expect(refused.status).toBe(422);
    expect(await refused.json()).toMatchObject({ error: { problems: [{ path: 'untilDay' }] } });
    const untold = { ...body, untilDay: '2026-02-30' };
    expect((await call('POST', '/api/hand-overs', { cookie: ownerCookie, body: untold })).status).toBe(422);
  });

  it('stands in the record, which owners read in pages', async () => {
    const read = (query: string) => call('GET', '/api/audit-trail', { cookie: ownerCookie, query });
    const page = (await (await read('')).json()) as { entries: { id: number; action: string }[]; before: null };
    expect(page.entries.map(({ action }) => action)).toEqual([
      'take-back-hand-over',
      // Saved the same again it is no change.
      'save-house-notes',
      'agree-hand-over',
      'hand-over',
    ]);
    expect(page.before).toBeNull();
    const second = page.entries[1]?.id;
    const older = (await (await read(`?before=${second}`)).json()) as typeof page;
    expect(older.entries).toEqual(page.entries.slice(2));
    expect((await read('?before=x')).status).toBe(422);
  });
});
