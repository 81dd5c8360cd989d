import { describe, expect, it } from 'vitest';
import { sessions } from '@/db/schema';
import { sessionsOf } from '@/lib/auth/sessions';
import { readEnvironment } from '@/lib/env';
import { aHousehold, freshDatabase } from '@/tests/support/test-database';
import { cookieOf } from '@/tests/support/api';

const secret = 'a secret of this test, long enough to be one';
const over = (origin: string) =>
  readEnvironment({ NODE_ENV: 'production', APP_ORIGIN: origin, WADEWELL_SECRET: secret });

describe('the cookie of a session', () => {
  it.each([
    { origin: 'http://127.0.0.1:3000', name: 'wadewell', secure: false },
    { origin: 'http://pool.local:8080', name: 'wadewell', secure: false },
    { origin: 'https://pool.example', name: '__Host-wadewell', secure: true },
  ])('over $origin', async ({ origin, name, secure }) => {
    const db = freshDatabase();
    const { personId } = await aHousehold(db);
    const { cookie } = await sessionsOf(db, over(origin)).start(personId, null);
    expect(cookie.split('=')[0]).toBe(name);
    const attributes = cookie.split('; ').slice(1);
    expect(attributes).toEqual(expect.arrayContaining(['HttpOnly', 'SameSite=Lax', 'Path=/']));
    expect(attributes.includes('Secure')).toBe(secure);
    // __Host- is honoured only without a domain.
    expect(cookie).not.toContain('Domain');
  });

  it('opens the session, and is worth nothing once that has ended', async () => {
    const db = freshDatabase();
    const { personId, householdId } = await aHousehold(db);
    const kept = sessionsOf(db, over('http://127.0.0.1:3000'));
    const { cookie, signedIn } = await kept.start(personId, householdId);
    const sent = `theme=dark; ${cookieOf(cookie)}; other=%`;
    expect((await kept.find(sent))?.signedIn).toEqual(signedIn);
    expect(await kept.end(signedIn.sessionId)).toMatch(/^wadewell=;.*Max-Age=0/);
    expect(await kept.find(sent)).toBeNull();
  });

  it('cannot be made from what the database holds, nor read under another secret', async () => {
    const db = freshDatabase();
    const { personId } = await aHousehold(db);
    const settings = over('http://127.0.0.1:3000');
    const { cookie } = await sessionsOf(db, settings).start(personId, null);
    const token = cookieOf(cookie).slice('wadewell='.length);
    const [row] = await db.select().from(sessions);
    expect(row?.id).not.toContain(token);
    expect(await sessionsOf(db, settings).find(`wadewell=${row?.id}`)).toBeNull();
    expect(await sessionsOf(db, { ...settings, secret: `${secret}!` }).find(`wadewell=${token}`)).toBeNull();
  });

  it('ends after ninety days, however often somebody comes back', async () => {
    const db = freshDatabase();
    const { personId } = await aHousehold(db);
    const began = new Date('2026-07-05T12:00:00Z');
    const at = (days: number) =>
      sessionsOf(db, { ...over('http://127.0.0.1:3000'), now: new Date(began.getTime() + days * 24 * 3_600_000) });
    const { cookie } = await at(0).start(personId, null);
    for (const days of [1, 30, 60, 89.9]) expect(await at(days).find(cookieOf(cookie))).not.toBeNull();
    expect(await at(90).find(cookieOf(cookie))).toBeNull();
    expect(await at(1).find(cookieOf(cookie))).toBeNull();
  });

  it('ends after thirty days in which nobody came, and is prolonged for who comes in the second half of them', async () => {
    const db = freshDatabase();
    const { personId } = await aHousehold(db);
    const kept = sessionsOf(db, over('http://127.0.0.1:3000'));
    const { cookie } = await kept.start(personId, null);
    const in_ = (days: number) => db.update(sessions).set({ expiresAt: Math.floor(Date.now() / 1000 + days * 86_400) });
    await in_(14);
    expect((await kept.find(cookieOf(cookie)))?.prolonged).toContain('wadewell=');
    const [row] = await db.select().from(sessions);
    expect(Math.round((row!.expiresAt - Date.now() / 1000) / 86_400)).toBe(30);
    await in_(-0.01);
    expect(await kept.find(cookieOf(cookie))).toBeNull();
  });

  it('over plain http is not taken for one over https', async () => {
    const db = freshDatabase();
    const { personId } = await aHousehold(db);
    const { cookie } = await sessionsOf(db, over('http://127.0.0.1:3000')).start(personId, null);
    expect(await sessionsOf(db, over('https://pool.example')).find(cookieOf(cookie))).toBeNull();
  });
});
