import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { rateLimits } from '@/db/schema';
import { call, cookieOf, serveFreshDatabase } from '@/tests/support/api';

let db: Database;
beforeAll(() => {
  db = serveFreshDatabase();
  // Read once, at the first call. Nothing listens there: what is sent waits.
  process.env.SMTP_URL = 'smtp://127.0.0.1:9';
  process.env.MAIL_FROM = 'wadewell@pool.example';
});

const tries = process.env.LONG === '1' ? 200 : 15;
const password = 'larch water evening';
const someEmail = () => `${crypto.randomUUID()}@pool.example`;
const up = (email: string) =>
  call('POST', '/api/sign-up', {
    body: {
      ...{ name: 'Ines', email, password, householdName: 'The Larches' },
      ...{ timeZone: 'Europe/Madrid', unitSystem: 'metric', locale: 'en-US' },
    },
  });
const signIn = (email: string) => call('POST', '/api/sign-in', { body: { email, password: 'not this one' } });
const ask = (email: string) => call('POST', '/api/password-resets', { body: { email } });
const change = (cookie: string) => (email: string) =>
  call('PUT', '/api/account/email', { cookie, body: { current: password, email } });

/** Medians of both, asked in turn so that whatever else the machine does hits both [ms]. */
async function medians(known: () => Promise<unknown>, unknown: () => Promise<unknown>): Promise<[number, number]> {
  const times: [number[], number[]] = [[], []];
  for (let tried = -2; tried < tries; tried += 1)
    for (const which of tried % 2 === 0 ? ([0, 1] as const) : ([1, 0] as const)) {
      await db.delete(rateLimits);
      const started = performance.now();
      await (which === 0 ? known : unknown)();
      if (tried >= 0) times[which].push(performance.now() - started);
    }
  const median = (values: number[]) => values.toSorted((a, b) => a - b)[Math.floor(values.length / 2)]!;
  return [median(times[0]), median(times[1])];
}

/** A generous bar: without the work that stands in for a password, one of the two would take a tenth of the other. */
function expectAlike(what: string, [known, unknown]: [number, number]): void {
  console.log(
    `reference: ${what} takes ${known.toFixed(1)} ms for a known address, ${unknown.toFixed(1)} ms for another`,
  );
  expect(known / unknown).toBeGreaterThan(0.5);
  expect(known / unknown).toBeLessThan(2);
}

describe('who has an account is told by no answer', { timeout: 240_000 }, () => {
  let held: string;
  let given: string;
  beforeAll(async () => {
    held = someEmail();
    given = someEmail();
    await up(held);
    await up(given);
    const { setEmail } = await import('@/db/queries/people');
    const { findUnprovenByEmail } = await import('@/db/queries/people');
    const { systemScope } = await import('@/lib/auth/system-scope');
    const person = await findUnprovenByEmail(db, systemScope('mail'), held);
    await setEmail(db, { personId: person!.id, email: held, confirmedAt: new Date() });
  });

  it('nor by the time of signing in', async () => {
    const [known, unknown] = [await signIn(held), await signIn(someEmail())];
    expect([known.status, await known.text()]).toEqual([unknown.status, await unknown.text()]);
    expectAlike(
      'signing in',
      await medians(
        () => signIn(held),
        () => signIn(someEmail()),
      ),
    );
    expectAlike(
      'signing in where the address was only given',
      await medians(
        () => signIn(given),
        () => signIn(someEmail()),
      ),
    );
  });

  it('nor by signing up', async () => {
    const [known, unknown] = [await up(held), await up(someEmail())];
    expect([known.status, await known.text()]).toEqual([unknown.status, await unknown.text()]);
    expect([...known.headers.keys()]).toEqual([...unknown.headers.keys()]);
    expectAlike(
      'signing up',
      await medians(
        () => up(held),
        () => up(someEmail()),
      ),
    );
  });

  it('nor by what such an account is like inside', async () => {
    const accounts: unknown[] = [];
    for (const email of [held, someEmail()]) {
      const cookie = cookieOf((await up(email)).headers.get('set-cookie'));
      const again = await call('POST', '/api/account/confirmation', { cookie });
      const account = (await (await call('GET', '/api/account', { cookie })).json()) as Record<string, unknown>;
      const entered = await call('POST', '/api/sign-in', { body: { email, password } });
      accounts.push({ ...account, email: 'left out', mail: 'left out', again: again.status, signsIn: entered.status });
      expect(account).toMatchObject({ email, confirmed: false });
    }
    expect(accounts[0]).toEqual(accounts[1]);
  });

  it('nor by asking for another password', async () => {
    const [known, unknown] = [await ask(held), await ask(someEmail())];
    expect([known.status, await known.text()]).toEqual([unknown.status, await unknown.text()]);
    // So little is done before the answer that half a millisecond would be twice as long.
    const [first, second] = await medians(
      () => ask(held),
      () => ask(someEmail()),
    );
    expect(Math.abs(first - second)).toBeLessThan(20);
  });

  it('nor by asking for another address', async () => {
    const cookie = cookieOf((await up(someEmail())).headers.get('set-cookie'));
    const [known, unknown] = [await change(cookie)(held), await change(cookie)(someEmail())];
    expect([known.status, await known.text()]).toEqual([unknown.status, await unknown.text()]);
    expectAlike(
      'asking for another address',
      await medians(
        () => change(cookie)(held),
        () => change(cookie)(someEmail()),
      ),
    );
  });
});
