import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { people, sessions } from '@/db/schema';
import type { SignedInDevice } from '@/lib/schemas/device';
import { call, cookieOf, serveFreshDatabase } from '@/tests/support/api';

let db: Database;
beforeAll(() => {
  db = serveFreshDatabase();
});

const firefox = 'Mozilla/5.0 (X11; Linux x86_64; rv:142.0) Gecko/20100101 Firefox/142.0';
const password = 'larch water evening';
const sessionOf = (response: Response) => cookieOf(response.headers.get('set-cookie'));
const signUp = async (email: string) =>
  sessionOf(
    await call('POST', '/api/sign-up', {
      headers: { 'user-agent': firefox },
      body: {
        ...{ name: 'Ines', email, password, householdName: 'The Larches' },
        ...{ timeZone: 'Europe/Madrid', unitSystem: 'metric', locale: 'es-ES' },
      },
    }),
  );
const signIn = async (email: string, more: Parameters<typeof call>[2] = {}) =>
  sessionOf(await call('POST', '/api/sign-in', { ...more, body: { email, password } }));
const devicesOf = async (cookie: string) =>
  (await (await call('GET', '/api/sessions', { cookie })).json()) as SignedInDevice[];
const signOutOn = (cookie: string, id: string) => call('DELETE', '/api/sessions/[id]', { cookie, path: { id } });
const isIn = async (cookie: string) => (await call('GET', '/api/households', { cookie })).status === 200;

describe('the list of devices', () => {
  it('names each by two words, this one first, without what is stored of it', async () => {
    const desk = await signUp('list@pool.example');
    await signIn('list@pool.example');
    const [first, second, ...rest] = await devicesOf(desk);
    expect(first).toMatchObject({ current: true, device: { browser: 'firefox', system: 'linux' } });
    expect(second).toMatchObject({ current: false, device: null });
    expect(rest).toEqual([]);
    expect(Date.parse(first?.startedAt ?? '')).toBeGreaterThan(Date.now() - 60_000);
    const rows = await db.select().from(sessions);
    expect(JSON.stringify(rows)).not.toContain('Gecko');
    expect(rows.map(({ id }) => id)).not.toContain(first?.id);
  });

  it('is each person’s own', async () => {
    const hers = await signUp('hers@pool.example');
    const his = await signUp('his@pool.example');
    const [device] = await devicesOf(hers);
    expect((await signOutOn(his, device?.id ?? '')).status).toBe(404);
    expect((await signOutOn(his, 'none')).status).toBe(404);
    expect(await isIn(hers)).toBe(true);
    expect(await devicesOf(his)).toHaveLength(1);
  });

  it('says when somebody was there to the hour, without writing at each request', async () => {
    const cookie = await signUp('seen@pool.example');
    const [person] = await db.select().from(people).where(eq(people.email, 'seen@pool.example'));
    const mine = eq(sessions.userId, person?.id ?? '');
    const ago = (minutes: number) => new Date(Math.floor(Date.now() / 1000) * 1000 - minutes * 60_000);
    const seen = async () => (await db.select().from(sessions).where(mine))[0]?.lastSeenAt;
    await db
      .update(sessions)
      .set({ lastSeenAt: ago(59) })
      .where(mine);
    const before = await seen();
    await isIn(cookie);
    expect(await seen()).toEqual(before);
    await db
      .update(sessions)
      .set({ lastSeenAt: ago(61) })
      .where(mine);
    await isIn(cookie);
    expect((await seen())?.getTime()).toBeGreaterThan(Date.now() - 60_000);
    // As one that began before this was kept.
    await db.update(sessions).set({ lastSeenAt: null, device: null }).where(mine);
    expect(await devicesOf(cookie)).toMatchObject([{ device: null, lastSeenAt: expect.any(String) }]);
    // Without a beginning nobody knows how long it has run.
    await db.update(sessions).set({ startedAt: null }).where(mine);
    expect(await isIn(cookie)).toBe(false);
  });
});

describe('signing out on one device', () => {
  it('ends that one and no other', async () => {
    const email = 'one-device@pool.example';
    const desk = await signUp(email);
    const phone = await signIn(email);
    const tablet = await signIn(email);
    const phones = (await devicesOf(phone)).find(({ current }) => current);
    const answer = await signOutOn(desk, phones?.id ?? '');
    expect((await answer.json()) as SignedInDevice[]).toHaveLength(2);
    expect([await isIn(desk), await isIn(phone), await isIn(tablet)]).toEqual([true, false, true]);
    expect((await signOutOn(desk, phones?.id ?? '')).status).toBe(404);
  });

  it('on this one takes the cookie away', async () => {
    const cookie = await signUp('this-one@pool.example');
    const [device] = await devicesOf(cookie);
    const answer = await signOutOn(cookie, device?.id ?? '');
    expect(answer.headers.get('set-cookie')).toContain('Max-Age=0');
    expect(await isIn(cookie)).toBe(false);
  });
});

it('ends the former session of a device when the same person signs in on it again', async () => {
  const email = 'again@pool.example';
  const former = await signUp(email);
  const kept = await signIn(email, { cookie: former });
  expect(kept).not.toBe(former);
  expect([await isIn(former), await isIn(kept)]).toEqual([false, true]);
  expect(await devicesOf(kept)).toHaveLength(1);
});
