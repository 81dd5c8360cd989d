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

  it('over plain http is not taken for one over https', async () => {
    const db = freshDatabase();
    const { personId } = await aHousehold(db);
    const { cookie } = await sessionsOf(db, over('http://127.0.0.1:3000')).start(personId, null);
    expect(await sessionsOf(db, over('https://pool.example')).find(cookieOf(cookie))).toBeNull();
  });
});
