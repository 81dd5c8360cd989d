import { randomUUID } from 'node:crypto';
import { eq } from 'drizzle-orm';
import { beforeAll, describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import type { Database } from '@/db/client';
import { memberships } from '@/db/schema';
import { publicRoute } from '@/lib/api/routes';
import { log } from '@/lib/log';
import { AppError } from '@/lib/errors';
import { call, serveFreshDatabase, signedInAs } from '@/tests/support/api';
import { aHousehold } from '@/tests/support/test-database';

let db: Database;
let owner: string;
beforeAll(async () => {
  db = serveFreshDatabase();
  owner = await signedInAs(db, await aHousehold(db));
});

const problemsOf = async (response: Response) =>
  ((await response.json()) as { error: { problems: { path: string; message: string }[] } }).error.problems;

describe('every reply', () => {
  it.each([
    ['GET', '/api/health', 200],
    ['GET', '/api/pool', 401],
    ['DELETE', '/api/pool', 405],
    ['POST', '/api/[...path]', 404],
  ] as const)('carries the headers of /api: %s %s', async (method, pattern, status) => {
    const response = await call(method, pattern);
    expect(response.status).toBe(status);
    expect(response.headers.get('content-security-policy')).toContain("default-src 'none'");
    expect(response.headers.get('x-content-type-options')).toBe('nosniff');
    expect(response.headers.get('cache-control')).toBe('no-store');
    expect(response.headers.get('content-type')).toContain('application/json');
  });

  it('to an unknown method lists the known ones', async () => {
    expect((await call('DELETE', '/api/pool')).headers.get('allow')).toBe('GET, PUT');
  });
});

describe('what was sent', () => {
  it('is refused field by field in plain words', async () => {
    const response = await call('PUT', '/api/pool', {
      cookie: owner,
      body: { step: 'size', answers: { how: 'entered', volume: 'sixty', unit: 'barrel', sure: true, colour: 'blue' } },
    });
    expect(response.status).toBe(422);
    expect(await problemsOf(response)).toEqual([
      { path: 'answers.volume', message: 'Write the volume.' },
      { path: 'answers.unit', message: 'Choose the unit of the volume.' },
      { path: 'answers.colour', message: 'Wadewell does not know this field: colour.' },
    ]);
  });

  it.each([
    ['no JSON', '{"step":', 422],
    ['nothing', '', 422],
    ['a list', '[]', 422],
    ['null', 'null', 422],
    ['too much', JSON.stringify({ note: 'x'.repeat(70_000) }), 413],
  ])('is refused when it is %s', async (_what, text, status) => {
    const response = await call('PUT', '/api/pool', { cookie: owner, text });
    expect(response.status).toBe(status);
    expect(await response.json()).toMatchObject({ error: { code: 'invalid-input' } });
  });

  it('is refused when it is a form of a page', async () => {
    const headers = { 'content-type': 'application/x-www-form-urlencoded' };
    expect((await call('PUT', '/api/pool', { cookie: owner, text: 'step=shelf', headers })).status).toBe(415);
  });
});

describe('a write from another place', () => {
  it.each([
    ['of another site', { 'sec-fetch-site': 'cross-site' }, 403],
    ['of a neighbour under the same domain', { 'sec-fetch-site': 'same-site' }, 403],
    ['of an older browser, from another origin', { 'sec-fetch-site': '', origin: 'http://evil.example' }, 403],
    ['of no browser at all', { 'sec-fetch-site': '' }, 403],
    ['of an older browser, from our origin', { 'sec-fetch-site': '', origin: 'http://127.0.0.1:3000' }, 200],
  ])(
    'is answered by its origin: %s',
    async (_what, { 'sec-fetch-site': site, ...rest }: Record<string, string>, status) => {
      const request = new Request('http://127.0.0.1:3000/api/sign-out', {
        method: 'POST',
        headers: { ...(site ? { 'sec-fetch-site': site } : {}), ...rest },
      });
      const { POST } = await import('@/app/api/sign-out/route');
      expect((await POST(request)).status).toBe(status);
    },
  );
});

describe('a fault', () => {
  const failing = (error: unknown) =>
    publicRoute({ reply: z.object({ done: z.literal(true) }), handle: () => Promise.reject(error) });
  const request = () => new Request('http://127.0.0.1:3000/api/x');

  it('that nobody foresaw says nothing but an id, under which it is logged', async () => {
    const logged = vi.spyOn(log(), 'error').mockImplementation(() => undefined);
    const response = await failing(new Error('SELECT secret FROM people'))(request());
    const text = await response.text();
    expect(response.status).toBe(500);
    expect(text).not.toContain('SELECT');
    const { error } = JSON.parse(text) as { error: { id: string; code: string } };
    expect(error.code).toBe('unexpected');
    expect(logged).toHaveBeenCalledWith(expect.objectContaining({ errorId: error.id }), 'fault');
    logged.mockRestore();
  });

  it.each([
    ['signed-out', 401],
    ['wrong-sign-in', 401],
    ['not-allowed', 403],
    ['not-found', 404],
    ['conflict', 409],
    ['too-many-requests', 429],
    ['water-out-of-range', 422],
    ['engine-busy', 503],
  ] as const)('of the closed list has its status: %s', async (code, status) => {
    const response = await failing(new AppError(code, 'In words.'))(request());
    expect(response.status).toBe(status);
    expect(await response.json()).toEqual({ error: { code, message: 'In words.', problems: [] } });
  });

  it('in a reply keeps what is not part of it', async () => {
    const row = { done: true as const, passwordHash: 'never' };
    const handler = publicRoute({ reply: z.object({ done: z.literal(true) }), handle: () => Promise.resolve(row) });
    expect(await (await handler(request())).json()).toEqual({ done: true });
  });
});

describe('the gate', () => {
  it('lets a member in until the membership ends, and no longer', async () => {
    const access = await aHousehold(db, { role: 'caretaker' });
    const cookie = await signedInAs(db, access);
    expect((await call('GET', '/api/pool', { cookie })).status).toBe(200);
    await db
      .update(memberships)
      .set({ validUntil: new Date('2026-07-06T00:00:00Z') })
      .where(eq(memberships.id, access.membershipId));
    expect((await call('GET', '/api/pool', { cookie })).status).toBe(403);
  });

  it.each([
    ['a token that nobody has', `wadewell=${'a'.repeat(40)}`],
    ['a garbled cookie', 'wadewell=%E0%A4%A; other=%'],
    ['somebody else’s cookie', 'sessionid=abc'],
  ])('keeps out %s', async (_what, cookie) => {
    expect((await call('GET', '/api/pool', { cookie })).status).toBe(401);
  });

  it('is not opened by naming a household in the request', async () => {
    const mine = await signedInAs(db, await aHousehold(db));
    const theirs = await aHousehold(db);
    const chosen = { body: { householdId: theirs.householdId }, cookie: mine };
    expect((await call('PUT', '/api/households/chosen', chosen)).status).toBe(403);
    const listed = await call('GET', '/api/households', { cookie: mine, query: `?householdId=${theirs.householdId}` });
    expect(JSON.stringify(await listed.json())).not.toContain(theirs.householdId);
    expect(
      (await call('PUT', '/api/households/chosen', { cookie: mine, body: { householdId: randomUUID() } })).status,
    ).toBe(403);
  });
});
