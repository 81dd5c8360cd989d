import { eq } from 'drizzle-orm';
import { afterEach, beforeAll, beforeEach, describe, expect, it, vi } from 'vitest';
import type { Database } from '@/db/client';
import { deleteExpiredPasskeyChallenges } from '@/db/queries/passkey-challenges';
import { passkeyChallenges, passkeys, people, rateLimits, sessions } from '@/db/schema';
import { userHandleOf } from '@/lib/auth/passkeys';
import { systemScope } from '@/lib/auth/system-scope';
import type { PasskeyCreation, PasskeyList, PasskeyRequest, PasskeySignIn } from '@/lib/schemas/passkey';
import { call, cookieOf, serveFreshDatabase } from '@/tests/support/api';
import { socketHeader, socketNote } from '@/lib/auth/visitor-address';
import { SoftwareAuthenticator } from '@/tests/support/software-authenticator';

const origin = 'http://localhost:3000';
const password = 'larch water evening';

let db: Database;
beforeAll(() => {
  process.env.APP_ORIGIN = origin;
  db = serveFreshDatabase();
});
beforeEach(() => db.delete(rateLimits));
afterEach(() => vi.useRealTimers());

const json = async <Body>(response: Response) => (await response.json()) as Body;
const sessionOf = (response: Response) => cookieOf(response.headers.get('set-cookie'));

async function signUp(): Promise<{ cookie: string; personId: string }> {
  const email = `${crypto.randomUUID()}@pool.example`;
  const household = { householdName: 'The Larches', timeZone: 'Europe/Madrid', unitSystem: 'metric', locale: 'en-US' };
  const response = await call('POST', '/api/sign-up', { body: { name: 'Ines', email, password, ...household } });
  const [person] = await db.select({ id: people.id }).from(people).where(eq(people.email, email));
  return { cookie: sessionOf(response), personId: person!.id };
}

const ask = (cookie: string, word = password) =>
  call('POST', '/api/passkeys/options', { cookie, body: { password: word } });
const asked = async (cookie: string) => json<PasskeyCreation>(await ask(cookie));
const add = (cookie: string, made: object, name = 'Phone') =>
  call('POST', '/api/passkeys', { cookie, body: { ...made, name } });
const list = async (cookie: string) =>
  (await json<PasskeyList>(await call('GET', '/api/passkeys', { cookie }))).passkeys;

/** Somebody with an account and a passkey. */
async function somebody(device = new SoftwareAuthenticator(origin)) {
  const { cookie, personId } = await signUp();
  expect((await add(cookie, device.create(await asked(cookie)))).status).toBe(200);
  return { cookie, personId, device };
}

const request = async () => json<PasskeyRequest>(await call('POST', '/api/sign-in/passkey/options'));
const signIn = (answer: PasskeySignIn) => call('POST', '/api/sign-in/passkey', { body: answer });
const ofPerson = (personId: string) => db.$count(sessions, eq(sessions.userId, personId));
const passLater = (milliseconds: number) => {
  vi.useFakeTimers({ toFake: ['Date'], now: Date.now() + milliseconds });
};

const sentence = 'This passkey does not open a sheet here. Sign in with your e-mail address and your password.';
async function expectRefused(response: Response) {
  expect(response.status).toBe(401);
  expect(await response.json()).toEqual({ error: { code: 'wrong-sign-in', message: sentence, problems: [] } });
  expect(response.headers.get('set-cookie')).toBeNull();
}

describe('adding a passkey', () => {
  it('asks for one that its owner opens and that needs no name, and keeps only its public half', async () => {
    const { cookie, personId } = await signUp();
    const options = await asked(cookie);
    expect(options).toMatchObject({
      rp: { id: 'localhost' },
      user: { id: userHandleOf(personId) },
      attestation: 'none',
      excludeCredentials: [],
      authenticatorSelection: { residentKey: 'required', userVerification: 'required' },
    });
    const device = new SoftwareAuthenticator(origin);
    const added = await json<PasskeyList>(await add(cookie, device.create(options), ' Phone '));
    expect(added).toMatchObject({ passkeys: [{ id: device.id, name: 'Phone', lastUsedAt: null }], obstacle: null });
    expect(await list(cookie)).toEqual(added.passkeys);
    // Another time the device is told which ones it has.
    expect((await asked(cookie)).excludeCredentials).toMatchObject([{ id: device.id, transports: ['internal'] }]);
    const [row] = await db.select().from(passkeys).where(eq(passkeys.id, device.id));
    expect(row).toMatchObject({ personId, counter: 0, transports: ['internal'], backedUp: false });
  });

  it('keeps no challenge in the clear', async () => {
    const { cookie } = await signUp();
    const { challenge } = await asked(cookie);
    const kept = JSON.stringify(await db.select().from(passkeyChallenges));
    expect(kept).not.toContain(challenge);
  });

  it('is for whoever knows the password, and guessing ends', async () => {
    const { cookie } = await signUp();
    const before = await db.$count(passkeyChallenges);
    const wrong = await ask(cookie, 'not this one');
    expect(wrong.status).toBe(422);
    expect(await wrong.json()).toMatchObject({ error: { problems: [{ path: 'password' }] } });
    const statuses: number[] = [];
    for (let tried = 0; tried < 10; tried += 1) statuses.push((await ask(cookie, `guess ${tried}`)).status);
    expect(statuses.at(-1)).toBe(429);
    expect((await ask(cookie)).status).toBe(429);
    expect(await db.$count(passkeyChallenges)).toBe(before);
  });

  it('is not for a visitor of the demo', async () => {
    // Whoever looks round is a person without e-mail and password.
    const { cookie, personId } = await signUp();
    await db.update(people).set({ email: null, passwordHash: null }).where(eq(people.id, personId));
    const refused = await ask(cookie, password);
    expect(refused.status).toBe(403);
    expect(await refused.json()).toMatchObject({
      error: { message: 'A look round has no account, so it has no passkeys.' },
    });
  });

  it.each([
    ['another page', { origin: 'http://127.0.0.1:3000' }],
    ['another host', { rpId: '127.0.0.1' }],
    ['another challenge', { challenge: Buffer.alloc(32).toString('base64url') }],
    ['a device that did not make sure of its owner', { verified: false }],
    ['a sign-in', { type: 'webauthn.get' }],
    ['a word about who made the device', { format: 'android-key' }],
  ])('refuses what was made for %s', async (_, wrong) => {
    const { cookie } = await signUp();
    const made = new SoftwareAuthenticator(origin).create(await asked(cookie), wrong);
    expect((await add(cookie, made)).status).toBe(409);
    expect(await list(cookie)).toEqual([]);
  });

  it('refuses an id beside the one that was proven', async () => {
    const { cookie } = await signUp();
    const made = new SoftwareAuthenticator(origin).create(await asked(cookie));
    expect((await add(cookie, { ...made, id: 'another-one' })).status).toBe(409);
    expect(await list(cookie)).toEqual([]);
  });

  it('refuses an answer that comes twice, too late or from somebody else', async () => {
    const [ines, otto] = [await signUp(), await signUp()];
    const device = new SoftwareAuthenticator(origin);
    const made = device.create(await asked(ines.cookie));
    expect((await add(otto.cookie, made)).status).toBe(409);
    expect((await add(ines.cookie, made)).status).toBe(200);
    await call('DELETE', '/api/passkeys/[id]', { cookie: ines.cookie, path: { id: device.id } });
    expect((await add(ines.cookie, made)).status).toBe(409);
    const late = device.create(await asked(ines.cookie));
    passLater(5 * 60_000 + 1000);
    expect((await add(ines.cookie, late)).status).toBe(409);
    expect(await list(ines.cookie)).toEqual([]);
  });

  it('refuses the challenge of a sign-in', async () => {
    const { cookie } = await signUp();
    const options = await asked(cookie);
    const { challenge } = await request();
    const made = new SoftwareAuthenticator(origin).create(options, { challenge });
    expect((await add(cookie, made)).status).toBe(409);
  });

  it('leaves a passkey to whoever has it', async () => {
    const { device, personId } = await somebody();
    const { cookie } = await signUp();
    const taken = new SoftwareAuthenticator(origin, device.id).create(await asked(cookie));
    const refused = await add(cookie, taken);
    expect(await refused.json()).toMatchObject({
      error: { message: 'This passkey is known already. Make another one.' },
    });
    expect(await db.select().from(passkeys).where(eq(passkeys.id, device.id))).toMatchObject([{ personId }]);
  });

  it('ends at ten, also for two that come at once', async () => {
    const { cookie, personId } = await somebody();
    const [row] = await db.select().from(passkeys).where(eq(passkeys.personId, personId));
    const eight = Array.from({ length: 8 }, (_, number) => ({ ...row!, id: `${personId}-${number}` }));
    await db.insert(passkeys).values(eight);
    const two = await Promise.all(
      [1, 2].map(async () => new SoftwareAuthenticator(origin).create(await asked(cookie))),
    );
    const statuses = await Promise.all(two.map(async (made) => (await add(cookie, made)).status));
    expect(statuses.toSorted()).toEqual([200, 409]);
    expect(await list(cookie)).toHaveLength(10);
    const eleventh = await ask(cookie);
    expect(eleventh.status).toBe(409);
    expect(await eleventh.json()).toMatchObject({ error: { message: expect.stringMatching(/^You have 10 passkeys/) } });
  });
});

describe('signing in with a passkey', () => {
  it('opens a session of its own, with nothing else typed, and keeps when it was', async () => {
    const { device, personId, cookie } = await somebody();
    const options = await request();
    expect(options).toMatchObject({ rpId: 'localhost', userVerification: 'required' });
    device.counter = 7;
    const response = await signIn(device.get(options));
    expect(await response.json()).toEqual({ next: '/first-run' });
    expect(sessionOf(response)).not.toBe(cookie);
    const households = await call('GET', '/api/households', { cookie: sessionOf(response) });
    expect(await households.json()).toMatchObject([{ name: 'The Larches', current: true }]);
    expect(await ofPerson(personId)).toBe(2);
    const [row] = await db.select().from(passkeys).where(eq(passkeys.id, device.id));
    expect(row?.counter).toBe(7);
    expect(Math.abs(Date.now() - row!.lastUsedAt!.getTime())).toBeLessThan(60_000);
  });

  it('ends the session that was on the device before', async () => {
    const { device, personId, cookie } = await somebody();
    const body = device.get(await request());
    expect((await call('POST', '/api/sign-in/passkey', { cookie, body })).status).toBe(200);
    expect(await ofPerson(personId)).toBe(1);
  });

  it.each([
    ['for another page', { origin: 'https://elsewhere.example' }],
    ['for another host', { rpId: 'elsewhere.example' }],
    ['of another challenge', { challenge: Buffer.alloc(32).toString('base64url') }],
    ['without making sure of its owner', { verified: false }],
    ['as if it made a passkey', { type: 'webauthn.create' }],
    ['with an id that nobody has', { id: 'nobody' }],
    ['without saying whose it is', { userHandle: '' }],
    ['in the name of somebody else', { userHandle: userHandleOf(crypto.randomUUID()) }],
  ])('refuses what is signed %s', async (_, wrong) => {
    const { device, personId } = await somebody();
    await expectRefused(await signIn(device.get(await request(), wrong)));
    expect(await ofPerson(personId)).toBe(1);
  });

  it("refuses another person's passkey under one's own signature", async () => {
    const [ines, otto] = [await somebody(), await somebody()];
    const { id } = ines.device;
    await expectRefused(await signIn(otto.device.get(await request(), { id })));
    const userHandle = userHandleOf(ines.personId);
    await expectRefused(await signIn(otto.device.get(await request(), { id, userHandle })));
    expect(await ofPerson(ines.personId)).toBe(1);
  });

  it('refuses what is no answer at all', async () => {
    const { device } = await somebody();
    const answer = device.get(await request());
    for (const clientDataJSON of ['bnVsbA', 'e30', 'AAAA', answer.authenticatorData])
      await expectRefused(await signIn({ ...answer, clientDataJSON }));
    await expectRefused(await signIn({ ...answer, signature: 'AAAA', authenticatorData: 'AAAA' }));
  });

  it('takes an answer once, also of two at once, and not when it failed before', async () => {
    const { device, personId } = await somebody();
    const answer = device.get(await request());
    const both = await Promise.all([signIn(answer), signIn(answer)]);
    expect(both.map(({ status }) => status).toSorted()).toEqual([200, 401]);
    await expectRefused(await signIn(answer));
    const options = await request();
    await expectRefused(await signIn(device.get(options, { verified: false })));
    await expectRefused(await signIn(device.get(options)));
    expect(await ofPerson(personId)).toBe(2);
  });

  it('refuses an answer that is too late', async () => {
    const { device } = await somebody();
    const [soon, late] = [device.get(await request()), device.get(await request())];
    passLater(5 * 60_000 - 5000);
    expect((await signIn(soon)).status).toBe(200);
    passLater(6000);
    await expectRefused(await signIn(late));
  });

  it('refuses a challenge that was made for adding one', async () => {
    const { device, cookie } = await somebody();
    const { challenge } = await asked(cookie);
    await expectRefused(await signIn(device.get({ ...(await request()), challenge })));
  });

  it('refuses a count that does not rise: one of the two is a copy', async () => {
    const { device } = await somebody();
    const withCount = async (counter: number) => {
      device.counter = counter;
      return signIn(device.get(await request()));
    };
    expect((await withCount(0)).status).toBe(200);
    expect((await withCount(0)).status).toBe(200);
    expect((await withCount(9)).status).toBe(200);
    for (const counter of [9, 8, 0]) await expectRefused(await withCount(counter));
    expect((await withCount(10)).status).toBe(200);
    // Two at once with one count, each with a challenge of its own.
    device.counter = 11;
    const two = [device.get(await request()), device.get(await request())];
    const statuses = (await Promise.all(two.map(signIn))).map(({ status }) => status);
    expect(statuses.toSorted()).toEqual([200, 401]);
  });

  it('is slowed down for an address that tries without end', async () => {
    const headers = { [socketHeader]: socketNote('203.0.113.9') };
    const statuses: number[] = [];
    for (let tried = 0; tried < 201; tried += 1)
      statuses.push((await call('POST', '/api/sign-in/passkey/options', { headers })).status);
    expect(statuses.slice(198)).toEqual([200, 200, 429]);
    expect((await call('POST', '/api/sign-in/passkey/options')).status).toBe(200);
  });
});

describe('forgetting a passkey', () => {
  const forget = (cookie: string, id: string) => call('DELETE', '/api/passkeys/[id]', { cookie, path: { id } });

  it('lets nobody in with it any more', async () => {
    const { cookie, device } = await somebody();
    expect(await (await forget(cookie, device.id)).json()).toEqual({ passkeys: [], obstacle: null });
    await expectRefused(await signIn(device.get(await request())));
    expect((await forget(cookie, device.id)).status).toBe(404);
  });

  it('is for its owner alone', async () => {
    const [ines, otto] = [await somebody(), await somebody()];
    expect((await forget(otto.cookie, ines.device.id)).status).toBe(404);
    expect((await signIn(ines.device.get(await request()))).status).toBe(200);
  });
});

it('clears challenges away that nobody answered', async () => {
  await db.delete(passkeyChallenges);
  await request();
  const now = new Date(Date.now() + 4 * 60_000);
  await deleteExpiredPasskeyChallenges(db, systemScope('clean-up'), now);
  expect(await db.$count(passkeyChallenges)).toBe(1);
  passLater(6 * 60_000);
  await request();
  expect(await db.$count(passkeyChallenges)).toBe(1);
});
