import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { households, people, sessions } from '@/db/schema';
import { call, cookieOf, serveFreshDatabase } from '@/tests/support/api';

let db: Database;
beforeAll(() => {
  db = serveFreshDatabase();
});

const account = (email: string) => ({
  name: ' Ines ',
  email,
  password: 'larch water evening',
  householdName: 'The Larches',
  timeZone: 'Europe/Madrid',
  unitSystem: 'metric',
  locale: 'es-ES',
});
const signUp = (email: string, overrides = {}) =>
  call('POST', '/api/sign-up', { body: { ...account(email), ...overrides } });
const signIn = (email: string, password = 'larch water evening') =>
  call('POST', '/api/sign-in', { body: { email, password } });
const sessionOf = (response: Response) => cookieOf(response.headers.get('set-cookie'));

describe('signing up', () => {
  it('makes an account, a household with an owner and an open first run, and a session', async () => {
    const response = await signUp('ines@pool.example');
    expect(await response.json()).toEqual({ next: '/first-run' });
    const listed = await call('GET', '/api/households', { cookie: sessionOf(response) });
    expect(await listed.json()).toMatchObject([
      {
        name: 'The Larches',
        role: 'owner',
        timeZone: 'Europe/Madrid',
        current: true,
        poolCompleted: false,
        demo: false,
      },
    ]);
    const pool = await call('GET', '/api/pool', { cookie: sessionOf(response) });
    expect(await pool.json()).toMatchObject({
      nextStep: 'scope',
      completed: false,
      profile: { scope: null, size: null },
    });
    expect(JSON.stringify(await db.select().from(people))).not.toContain('larch water evening');
  });

  it('knows an address by whatever capitals it is written in', async () => {
    expect((await signUp('  Otto@Pool.example ')).status).toBe(200);
    const again = await signUp('otto@pool.example');
    expect(again.status).toBe(409);
    expect(await again.json()).toMatchObject({ error: { problems: [{ path: 'email' }] } });
    expect((await signIn('OTTO@pool.example')).status).toBe(200);
  });

  it('gives one address to one of two who ask at once, and leaves nothing of the other', async () => {
    const before = await db.$count(households);
    const answers = await Promise.all([signUp('twins@pool.example'), signUp('twins@pool.example')]);
    expect(answers.map(({ status }) => status).sort()).toEqual([200, 409]);
    expect(await db.$count(households)).toBe(before + 1);
  });

  it.each([
    ['password', 'short', 'Use at least 10 characters. A few words in a row are easy to keep in mind.'],
    ['password', 'Qwertyuiop', 'This password is one of those that are tried first. Choose another.'],
    ['email', 'ines', 'Write an e-mail address like ines@pool.example.'],
    ['name', '   ', 'Write your name.'],
    ['timeZone', 'Mars/Olympus', 'Choose a time zone such as America/New_York.'],
    ['unitSystem', 'imperial', 'Choose metric or US units.'],
    ['householdName', undefined, 'Write what you call the pool or the house.'],
  ])('says in words what is wrong with the %s %j', async (path, value, message) => {
    const before = await db.$count(people);
    const response = await signUp('new@pool.example', { [path]: value });
    expect(response.status).toBe(422);
    expect(await response.json()).toMatchObject({ error: { code: 'invalid-input', problems: [{ path, message }] } });
    expect(await db.$count(people)).toBe(before);
  });
});

describe('signing in and out', () => {
  it('answers a wrong password and an unknown e-mail alike', async () => {
    await signUp('mara@pool.example');
    const wrong = await signIn('mara@pool.example', 'something else');
    const unknown = await signIn('nobody@pool.example', 'something else');
    expect([wrong.status, unknown.status]).toEqual([401, 401]);
    expect(await wrong.text()).toBe(await unknown.text());
    expect(wrong.headers.get('set-cookie')).toBeNull();
  });

  it('ends the session on this device, and leaves the others', async () => {
    await signUp('lena@pool.example');
    const phone = sessionOf(await signIn('lena@pool.example'));
    const desk = sessionOf(await signIn('lena@pool.example'));
    const out = await call('POST', '/api/sign-out', { cookie: phone });
    expect(out.headers.get('set-cookie')).toContain('Max-Age=0');
    expect((await call('GET', '/api/pool', { cookie: phone })).status).toBe(401);
    expect((await call('GET', '/api/pool', { cookie: desk })).status).toBe(200);
  });

  it('ends the session that was before when somebody else signs in on the device', async () => {
    const first = sessionOf(await signUp('one@pool.example'));
    const before = await db.$count(sessions);
    await call('POST', '/api/sign-in', {
      cookie: first,
      body: { email: 'lena@pool.example', password: 'larch water evening' },
    });
    expect(await db.$count(sessions)).toBe(before);
    expect((await call('GET', '/api/pool', { cookie: first })).status).toBe(401);
  });

  it('is slowed down after ten wrong tries, for this e-mail only', async () => {
    await signUp('slow@pool.example');
    for (let tries = 0; tries < 10; tries += 1) expect((await signIn('slow@pool.example', 'wrong')).status).toBe(401);
    const refused = await signIn('slow@pool.example');
    expect(refused.status).toBe(429);
    const wait = Number(refused.headers.get('retry-after'));
    expect(wait > 800 && wait <= 900).toBe(true);
    expect((await signIn('lena@pool.example')).status).toBe(200);
  });
});

describe('the password', () => {
  const change = (cookie: string, current: string, password: string) =>
    call('PUT', '/api/account/password', { cookie, body: { current, password } });
  const isIn = async (cookie: string) => (await call('GET', '/api/households', { cookie })).status === 200;

  it('is changed by whoever knows it, and signs out every other device', async () => {
    const email = 'changes@pool.example';
    const first = sessionOf(await signUp(email));
    const second = sessionOf(await signIn(email));
    const changed = await change(second, 'larch water evening', 'heron over the mill');
    expect(changed.status).toBe(200);
    const kept = sessionOf(changed);
    expect(kept).not.toBe(second);
    expect([await isIn(first), await isIn(second), await isIn(kept)]).toEqual([false, false, true]);
    expect((await signIn(email)).status).toBe(401);
    expect((await signIn(email, 'heron over the mill')).status).toBe(200);
  });

  it('stays as it is for whoever does not know it, and guessing ends', async () => {
    const email = 'stays@pool.example';
    const cookie = sessionOf(await signUp(email));
    const wrong = await change(cookie, 'not this one', 'heron over the mill');
    expect(wrong.status).toBe(422);
    expect(await wrong.json()).toMatchObject({ error: { problems: [{ path: 'current' }] } });
    const statuses: number[] = [];
    for (let tried = 0; tried < 10; tried += 1)
      statuses.push((await change(cookie, `guess ${tried}`, 'heron over the mill')).status);
    expect(statuses.at(-1)).toBe(429);
    expect((await signIn(email)).status).toBe(200);
  });

  it('is not one of those that are tried first', async () => {
    const cookie = sessionOf(await signUp('common@pool.example'));
    const answer = await change(cookie, 'larch water evening', 'password123');
    expect(await answer.json()).toMatchObject({ error: { problems: [{ path: 'password' }] } });
  });
});

it('signs out everywhere else', async () => {
  const email = 'elsewhere@pool.example';
  const first = sessionOf(await signUp(email));
  const second = sessionOf(await signIn(email));
  const kept = sessionOf(await call('DELETE', '/api/sessions', { cookie: second }));
  const statuses = await Promise.all(
    [first, second, kept].map(async (cookie) => (await call('GET', '/api/households', { cookie })).status),
  );
  expect(statuses).toEqual([401, 401, 200]);
});
