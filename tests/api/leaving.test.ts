import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { households, people } from '@/db/schema';
import type { DeletionPreview } from '@/lib/schemas/account';
import type { HouseholdList } from '@/lib/schemas/household';
import { call, cookieOf, serveFreshDatabase, signedInAs } from '@/tests/support/api';
import { aHousehold, aMember } from '@/tests/support/test-database';

let db: Database;
beforeAll(() => {
  db = serveFreshDatabase();
});

const password = 'larch water evening';
const sessionOf = (response: Response) => cookieOf(response.headers.get('set-cookie'));
const account = (email: string) => ({
  ...{ name: 'Ines', email, password, householdName: 'The Larches' },
  ...{ timeZone: 'Europe/Madrid', unitSystem: 'metric', locale: 'es-ES' },
});
const signUp = async (email: string) => sessionOf(await call('POST', '/api/sign-up', { body: account(email) }));
const signIn = (email: string) => call('POST', '/api/sign-in', { body: { email, password } });
const previewOf = async (cookie: string) =>
  ((await (await call('GET', '/api/account/deletion', { cookie })).json()) as DeletionPreview).households;
const remove = (cookie: string, body: object) => call('DELETE', '/api/account', { cookie, body });
const householdsOf = async (cookie: string) =>
  (await (await call('GET', '/api/households', { cookie })).json()) as HouseholdList;
const another = { name: 'Heron Mill', timeZone: 'Europe/Madrid', unitSystem: 'metric', locale: 'es-ES' };
const make = (cookie: string, body: object = another) => call('POST', '/api/households', { cookie, body });
const close = (cookie: string, body: object) => call('DELETE', '/api/households/current', { cookie, body });

describe('deleting an account', () => {
  it('is said first, done with the password, and leaves the address free', async () => {
    const email = 'goes@pool.example';
    const cookie = await signUp(email);
    const desk = sessionOf(await signIn(email));
    const [household] = await previewOf(cookie);
    expect(household).toMatchObject({ name: 'The Larches', fate: 'deleted', others: 0 });
    expect(Object.keys(household ?? {}).sort()).toEqual(['fate', 'id', 'name', 'others']);
    const deletes = [household?.id];
    const wrong = await remove(cookie, { password: 'not this one', deletes });
    expect(await wrong.json()).toMatchObject({ error: { problems: [{ path: 'password' }] } });
    const unannounced = await remove(cookie, { password, deletes: [] });
    expect(unannounced.status).toBe(409);
    const done = await remove(cookie, { password, deletes });
    expect(await done.json()).toEqual({ done: true });
    expect(done.headers.get('set-cookie')).toContain('Max-Age=0');
    const statuses = await Promise.all(
      [cookie, desk].map(async (each) => (await call('GET', '/api/households', { cookie: each })).status),
    );
    expect(statuses).toEqual([401, 401]);
    expect((await signIn(email)).status).toBe(401);
    expect((await call('POST', '/api/sign-up', { body: account(email) })).status).toBe(200);
  });

  it('is not for a visitor of the demo', async () => {
    const member = await aHousehold(db);
    await db.update(people).set({ email: null, passwordHash: null });
    const cookie = await signedInAs(db, member);
    expect((await call('GET', '/api/account/deletion', { cookie })).status).toBe(403);
    expect((await remove(cookie, { password, deletes: [member.householdId] })).status).toBe(403);
    expect((await make(cookie)).status).toBe(403);
  });
});

describe('closing a household', () => {
  it('is for its owners, with password and name', async () => {
    const cookie = await signUp('closes@pool.example');
    const [{ id: householdId } = { id: '' }] = await householdsOf(cookie);
    const now = new Date();
    const viewer = await aMember(db, { householdId, role: 'viewer', now });
    const caretaker = await aMember(db, { householdId, role: 'caretaker', now });
    const others = [await signedInAs(db, viewer), await signedInAs(db, caretaker)];
    for (const other of others) expect((await close(other, { password, name: 'The Larches' })).status).toBe(403);
    expect((await close(cookie, { password: 'wrong', name: 'The Larches' })).status).toBe(422);
    expect((await close(cookie, { password, name: 'Something else' })).status).toBe(422);
    expect(await db.$count(households)).toBeGreaterThan(0);
    expect((await close(cookie, { password, name: 'The Larches' })).status).toBe(200);
    for (const each of [cookie, ...others]) {
      expect((await call('GET', '/api/week', { cookie: each })).status).toBe(403);
      expect(await householdsOf(each)).toEqual([]);
    }
  });

  it('lets nothing that was still sent from it land in another household', async () => {
    const cookie = await signUp('two@pool.example');
    const [first] = await householdsOf(cookie);
    await make(cookie);
    const elsewhere = sessionOf(await signIn('two@pool.example'));
    expect((await householdsOf(elsewhere)).find(({ current }) => current)?.id).toBe(first?.id);
    // This device looks at the new one; the other one at the first, which is closed from here.
    await call('PUT', '/api/households/chosen', { cookie, body: { householdId: first?.id } });
    expect((await close(cookie, { password, name: 'The Larches' })).status).toBe(200);
    for (const each of [cookie, elsewhere]) {
      const sent = await call('PATCH', '/api/households', { cookie: each, body: { name: 'Landed here' } });
      expect(sent.status).toBe(403);
      expect((await householdsOf(each)).map(({ name }) => name)).toEqual(['Heron Mill']);
    }
  });
});

describe('a household of one’s own', () => {
  it('is made by whoever belongs nowhere, and is looked at from then on', async () => {
    const cookie = await signUp('nowhere@pool.example');
    await close(cookie, { password, name: 'The Larches' });
    const made = await make(cookie);
    expect(await made.json()).toEqual({ next: '/first-run' });
    expect(await householdsOf(cookie)).toMatchObject([{ name: 'Heron Mill', role: 'owner', current: true }]);
    expect((await call('GET', '/api/pool', { cookie })).status).toBe(200);
  });

  it.each([
    ['name', '  '],
    ['timeZone', 'Mars/Olympus'],
    ['unitSystem', 'imperial'],
  ])('has a sound %s', async (path, value) => {
    const cookie = await signUp(`${path.toLowerCase()}@pool.example`);
    const answer = await make(cookie, { ...another, [path]: value });
    expect(await answer.json()).toMatchObject({ error: { problems: [{ path }] } });
  });

  it('is not one of very many', async () => {
    const cookie = await signUp('many@pool.example');
    const statuses: number[] = [];
    for (let made = 0; made < 21; made += 1) statuses.push((await make(cookie)).status);
    expect(statuses.filter((status) => status === 200)).toHaveLength(20);
    expect(statuses.at(-1)).toBe(429);
  });

  it('is made by nobody who is signed out', async () => {
    expect((await call('POST', '/api/households', { body: another })).status).toBe(401);
  });
});
