import { beforeAll, beforeEach, describe, expect, it } from 'vitest';
import { type Database, openDatabase } from '@/db/client';
import { rateLimits } from '@/db/schema';
import { countTry, limits, type RateLimit } from '@/lib/auth/rate-limit';
import { openVisit } from '@/lib/auth/visit';
import { socketHeader, socketNote } from '@/lib/auth/visitor-address';
import { environment } from '@/lib/env';
import { seeInvitation } from '@/lib/services/join-household';
import { openReset } from '@/lib/services/reset-password';
import { call, type Call, cookieOf, serveFreshDatabase } from '@/tests/support/api';
import { planWith } from '@/tests/support/engine';

planWith();

let db: Database & { url: string };
beforeAll(() => {
  db = serveFreshDatabase();
});
beforeEach(() => db.delete(rateLimits));

const here = '203.0.113.9';
const elsewhere = '198.51.100.1';
const from = (address: string) => ({ [socketHeader]: socketNote(address) });
const password = 'larch water evening';
const account = (email: string) => ({
  ...{ name: 'Ines', email, password, householdName: 'The Larches' },
  ...{ timeZone: 'Europe/Madrid', unitSystem: 'metric', locale: 'en-US' },
});
const someEmail = () => `${crypto.randomUUID()}@pool.example`;
const visitFrom = (address: string) => openVisit(new Headers(from(address)));
const token = 'x'.repeat(43);

/** Uses a limit up, but for so many tries, as a server would that was then ended and started again. */
async function spend(limit: RateLimit, value: string, left = 0): Promise<void> {
  const { keyOf } = await visitFrom(here);
  const before = { db: openDatabase(db.url), now: new Date(), keyOf };
  for (let tried = left; tried < limits[limit].most; tried += 1) await countTry(before, limit, value);
}

/** Whoever did too much is refused in words and told when to come back; whoever did nothing is not. */
async function expectLimit(limit: RateLimit, value: string, ask: (address: string) => Promise<Response>) {
  const free = await ask(here);
  expect(free.status).not.toBe(429);
  await db.delete(rateLimits);
  await spend(limit, value, 1);
  expect((await ask(here)).status).not.toBe(429);
  const refused = await ask(here);
  expect(refused.status).toBe(429);
  const wait = Number(refused.headers.get('retry-after'));
  expect(wait > 0 && wait <= limits[limit].windowMilliseconds / 1000).toBe(true);
  expect(await refused.json()).toMatchObject({
    error: { code: 'too-many-requests', message: expect.stringContaining('again') },
  });
}

const ask =
  (pattern: string, body: () => unknown, more: Call = {}, method: 'POST' | 'PUT' = 'POST') =>
  (address: string) =>
    call(method, pattern, { ...more, body: body(), headers: from(address) });

describe('limits by address hold after a restart, and for that address alone', () => {
  it.each([
    ['sign-in-address', ask('/api/sign-in', () => ({ email: someEmail(), password }))],
    ['sign-up-address', ask('/api/sign-up', () => account(someEmail()))],
    [
      'sign-up-address',
      ask('/api/invitations/sign-up', () => ({ token, name: 'Otto', email: someEmail(), password, locale: 'en' })),
    ],
    ['reset-address', ask('/api/password-resets', () => ({ token, password }), {}, 'PUT')],
    ['link-address', ask('/api/email-confirmations', () => ({ token }))],
    ['look-round-address', (address: string) => call('POST', '/api/look-round', { headers: from(address) })],
  ] as const)(
    '%s',
    async (limit, request) => {
      await expectLimit(limit, here, request);
      expect((await request(elsewhere)).status).not.toBe(429);
    },
    60_000,
  );

  it('accepting invitations, and opening their pages', async () => {
    const cookie = cookieOf(
      (await call('POST', '/api/sign-up', { body: account(someEmail()) })).headers.get('set-cookie'),
    );
    const accept = ask('/api/invitations/accept', () => ({ token }), { cookie });
    await expectLimit('invitation-address', here, accept);
    expect(await seeInvitation(await visitFrom(here), token)).toEqual({ state: 'too-often' });
    expect(await seeInvitation(await visitFrom(elsewhere), token)).toEqual({ state: 'unknown' });
  });

  it('opening links of mail', async () => {
    await spend('link-address', here, 1);
    expect(await openReset(await visitFrom(here), token)).toEqual({ state: 'unknown' });
    expect(await openReset(await visitFrom(here), token)).toEqual({ state: 'too-often' });
    expect(await openReset(await visitFrom(elsewhere), token)).toEqual({ state: 'unknown' });
  });

  it('whoever looks round already is let back in, as often as they like', async () => {
    const opened = await call('POST', '/api/look-round', { headers: from(here) });
    const cookie = cookieOf(opened.headers.get('set-cookie'));
    await db.delete(rateLimits);
    await spend('look-round-address', here);
    expect((await call('POST', '/api/look-round', { headers: from(here), cookie })).status).toBe(200);
  });
});

describe('limits by person or by what was typed hold from every address', () => {
  const anywhere = () => from(`192.0.2.${Math.floor(Math.random() * 250)}`);

  it('sign-in-email', async () => {
    const email = someEmail();
    await expectLimit('sign-in-email', email, () =>
      call('POST', '/api/sign-in', { body: { email, password }, headers: anywhere() }),
    );
  });

  it('sign-up-email', async () => {
    const email = someEmail();
    await expectLimit('sign-up-email', email, () =>
      call('POST', '/api/sign-up', { body: account(email), headers: anywhere() }),
    );
  });

  it('uploads, by person and by address, before anything is done with the picture', async () => {
    const signedUp = await call('POST', '/api/sign-up', { body: account(someEmail()) });
    const cookie = cookieOf(signedUp.headers.get('set-cookie'));
    const { signedIn } = await openVisit(new Headers({ cookie }));
    const upload = (address: string) =>
      call('POST', '/api/photos', {
        cookie,
        bytes: new Uint8Array([1, 2, 3]),
        headers: { 'content-type': 'image/jpeg', ...from(address) },
        query: `?id=${crypto.randomUUID()}&kind=equipment`,
      });
    await expectLimit('upload-person', signedIn!.personId, upload);
    await db.delete(rateLimits);
    await expectLimit('upload-address', here, upload);
    expect((await upload(elsewhere)).status).not.toBe(429);
  });

  it('invitations, new ones and those sent again', async () => {
    const cookie = cookieOf(
      (await call('POST', '/api/sign-up', { body: account(someEmail()) })).headers.get('set-cookie'),
    );
    const { signedIn } = await openVisit(new Headers({ cookie }));
    const body = () => ({ id: crypto.randomUUID(), name: 'Otto', role: 'viewer', chemicalsAllowed: false });
    await expectLimit('invite-person', signedIn!.personId, ask('/api/invitations', body, { cookie }));
    const again = await call('PUT', '/api/invitations/[id]', { cookie, path: { id: crypto.randomUUID() } });
    expect(again.status).toBe(429);
    expect(await again.json()).toMatchObject({
      error: { message: 'That was too often for one day. Try again tomorrow.' },
    });
  });
});

it('where no mail leaves, who has an address is told five times an hour, and then not even that one is free', async () => {
  const email = someEmail();
  const up = (address: string, as = email) =>
    call('POST', '/api/sign-up', { body: account(as), headers: from(address) });
  expect((await up(elsewhere)).status).toBe(200);
  for (let tried = 0; tried < 5; tried += 1) expect((await up(here)).status).toBe(409);
  const [taken, free] = [await up(here), await up(here, someEmail())];
  expect([taken.status, free.status]).toEqual([429, 429]);
  expect(await taken.text()).toBe(await free.text());
  expect((await up(elsewhere, someEmail())).status).toBe(200);
});

it('every limit has words for how long to wait', async () => {
  const { keyOf } = await visitFrom(here);
  for (const limit of Object.keys(limits) as RateLimit[]) {
    const visit = { db, now: new Date(), keyOf };
    await spend(limit, 'words');
    await expect(countTry(visit, limit, 'words')).rejects.toMatchObject({ code: 'too-many-requests' });
  }
  expect(environment().trustedProxies).toBeNull();
});

describe('sessions', () => {
  const signIn = (email: string, cookie?: string) =>
    call('POST', '/api/sign-in', { body: { email, password }, ...(cookie === undefined ? {} : { cookie }) });
  const sessionOf = (response: Response) => cookieOf(response.headers.get('set-cookie'));
  const isIn = async (cookie: string) => (await call('GET', '/api/account', { cookie })).status === 200;

  it('are new at each sign-in: a cookie that somebody planted is never taken over', async () => {
    const email = someEmail();
    await call('POST', '/api/sign-up', { body: account(email) });
    const planted = `wadewell=${'a'.repeat(40)}`;
    expect(await isIn(planted)).toBe(false);
    const own = sessionOf(await signIn(email, planted));
    expect(own).not.toBe(planted);
    expect([await isIn(own), await isIn(planted)]).toEqual([true, false]);
    // One that is good, but somebody else's: theirs ends, and the new one is another.
    const others = sessionOf(await call('POST', '/api/sign-up', { body: account(someEmail()) }));
    const fresh = sessionOf(await signIn(email, others));
    expect(fresh).not.toBe(others);
    expect([await isIn(fresh), await isIn(others)]).toEqual([true, false]);
  });

  it('are another one once an invitation was accepted, and the one before is dead', async () => {
    const owner = sessionOf(await call('POST', '/api/sign-up', { body: account(someEmail()) }));
    const guest = sessionOf(await call('POST', '/api/sign-up', { body: account(someEmail()) }));
    const body = { id: crypto.randomUUID(), name: 'Otto', role: 'viewer', chemicalsAllowed: false };
    const { link } = (await (await call('POST', '/api/invitations', { cookie: owner, body })).json()) as {
      link: string;
    };
    const accepted = await call('POST', '/api/invitations/accept', {
      cookie: guest,
      body: { token: link.split('/').at(-1) },
    });
    expect(accepted.status).toBe(200);
    const renewed = sessionOf(accepted);
    expect(renewed).not.toBe(guest);
    expect([await isIn(renewed), await isIn(guest)]).toEqual([true, false]);
    const households = (await (await call('GET', '/api/households', { cookie: renewed })).json()) as {
      current: boolean;
      role: string;
    }[];
    expect(households.find(({ current }) => current)?.role).toBe('viewer');
  });

  it('are dead once somebody has signed out, and the device is told to forget', async () => {
    const cookie = sessionOf(await call('POST', '/api/sign-up', { body: account(someEmail()) }));
    const out = await call('POST', '/api/sign-out', { cookie });
    expect(out.headers.get('clear-site-data')).toBe('"cache", "storage"');
    expect(await isIn(cookie)).toBe(false);
  });
});
