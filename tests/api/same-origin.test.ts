import { beforeAll, expect, it } from 'vitest';
import { sql } from 'drizzle-orm';
import type { Database } from '@/db/client';
import { aHousehold } from '@/tests/support/test-database';
import { call, routePatterns, serveFreshDatabase, signedInAs, writeMethods } from '@/tests/support/api';

let db: Database;
let cookie: string;
beforeAll(async () => {
  db = serveFreshDatabase();
  cookie = await signedInAs(db, await aHousehold(db));
});

const writes = routePatterns.flatMap((pattern) => writeMethods.map((method) => ({ method, pattern })));
const elsewhere: Record<string, Record<string, string>> = {
  'another site': { 'sec-fetch-site': 'cross-site', origin: 'https://elsewhere.example' },
  'a site of the same owner': { 'sec-fetch-site': 'same-site', origin: 'http://other.127.0.0.1' },
  'a bookmark or a typed address': { 'sec-fetch-site': 'none' },
};

const changes = async () => (await db.get<{ changes: number }>(sql`select total_changes() as changes`))?.changes;

it('is looked at by enough routes to be all of them', () => {
  expect(writes.length).toBeGreaterThan(120);
});

it.each(Object.entries(elsewhere))('no write that comes from %s does anything, on any route', async (_, headers) => {
  const before = await changes();
  const wrong: string[] = [];
  for (const { method, pattern } of writes) {
    const answer = await call(method, pattern, { cookie, body: {}, headers, path: { id: crypto.randomUUID() } });
    const refused = answer.status === 403 && (await answer.text()).includes('sent from another site');
    // Of what a route does not answer it says so, to everybody, and of an unknown address as well.
    if (!refused && ![404, 405].includes(answer.status)) wrong.push(`${method} ${pattern} answered ${answer.status}`);
  }
  expect(wrong).toEqual([]);
  expect(await changes()).toBe(before);
});
