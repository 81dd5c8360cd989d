import { randomUUID } from 'node:crypto';
import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { updatePool } from '@/db/queries/pools';
import { saveShelfProduct } from '@/db/queries/shelf-products';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { now } from '@/lib/env';
import { readingListSchema } from '@/lib/schemas/reading-list';
import { recordedReadingSchema } from '@/lib/schemas/reading';
import { type WeekSheet, weekSheetSchema } from '@/lib/schemas/week-sheet';
import { call, cookieOf, serveFreshDatabase, signedInAs } from '@/tests/support/api';
import { planWith } from '@/tests/support/engine';
import { aFullTest, designPool, designShelf } from '@/tests/support/pool-household';
import { aHousehold, aMember } from '@/tests/support/test-database';

planWith();
// A midsummer evening, so that there is something to plan whenever these tests run.
process.env.TEST_CLOCK = '2026-07-05T19:00:00-04:00';

const hoursFromNow = (hours: number) => new Date(now().getTime() + hours * 3_600_000);
const problemPaths = async (response: Response) =>
  ((await response.json()) as { error: { problems: { path: string }[] } }).error.problems.map(({ path }) => path);

describe('readings, week and ticks over HTTP', { timeout: 60_000 }, () => {
  let db: Database;
  let owner: HouseholdAccess;
  let cookie: string;
  let viewer: string;
  let reading: ReturnType<typeof aFullTest>;
  beforeAll(async () => {
    db = serveFreshDatabase();
    reading = aFullTest(hoursFromNow(-1));
    const since = hoursFromNow(-2);
    owner = await aHousehold(db, { now: since });
    const { householdId } = owner;
    await updatePool(db, householdId, designPool);
    for (const product of designShelf) await saveShelfProduct(db, { householdId, product, now: since });
    cookie = await signedInAs(db, owner);
    viewer = await signedInAs(db, await aMember(db, { householdId, role: 'viewer', now: since }));
  });

  const week = async (query = ''): Promise<WeekSheet> =>
    weekSheetSchema.parse(await (await call('GET', '/api/week', { cookie, query })).json());

  it('records a test, and shows it to all with its plan', async () => {
    const sent = await call('POST', '/api/readings', { cookie, body: reading });
    expect(sent.status).toBe(200);
    expect(recordedReadingSchema.parse(await sent.json()).values).toEqual(reading.values);
    for (const who of [cookie, viewer]) {
      const listed = await call('GET', '/api/readings', { cookie: who });
      expect(readingListSchema.parse(await listed.json()).map(({ id }) => id)).toEqual([reading.id]);
    }
    const sheet = await week();
    expect(sheet.lastReading?.id).toBe(reading.id);
    expect(sheet.plan?.version).toBe(1);
    expect(sheet.ahead?.hours).toHaveLength(169);
  });

  it('names the fields of a test that cannot be', async () => {
    const impossible = { ...aFullTest(), values: { freeChlorine: 400, pH: 7.4 }, note: 'x'.repeat(501) };
    const refused = await call('POST', '/api/readings', { cookie, body: impossible });
    expect(refused.status).toBe(422);
    expect((await problemPaths(refused)).toSorted()).toEqual(['note', 'values.freeChlorine']);
    const future = aFullTest(hoursFromNow(1));
    const tomorrow = await call('POST', '/api/readings', { cookie, body: future });
    expect(tomorrow.status).toBe(422);
    expect(await problemPaths(tomorrow)).toEqual(['takenAt']);
    expect((await call('GET', '/api/week', { cookie, query: '?start=yesterday' })).status).toBe(422);
    expect((await call('GET', '/api/readings', { cookie, query: '?from=2026' })).status).toBe(422);
  });

  it('corrects a test, and deletes one', async () => {
    const mistaken = aFullTest(hoursFromNow(-2), {
      kind: 'quick',
      values: { freeChlorine: 3, pH: 7.1 },
    });
    await call('POST', '/api/readings', { cookie, body: mistaken });
    const path = { id: mistaken.id };
    const corrected = { ...mistaken, values: { freeChlorine: 3, pH: 7.5 } };
    const put = await call('PUT', '/api/readings/[id]', { cookie, path, body: corrected });
    expect(recordedReadingSchema.parse(await put.json()).values.pH).toBe(7.5);
    expect((await call('DELETE', '/api/readings/[id]', { cookie, path })).status).toBe(200);
    expect((await call('DELETE', '/api/readings/[id]', { cookie, path })).status).toBe(404);
    expect((await call('PUT', '/api/readings/[id]', { cookie: viewer, path, body: corrected })).status).toBe(403);
    expect((await call('DELETE', '/api/readings/[id]', { cookie, path: { id: 'none' } })).status).toBe(422);
  });

  it('answers a tick with the sheet, and says why not when it cannot be', async () => {
    const sheet = await week();
    const dose = [...sheet.doses, ...(await week(`?start=${nextWeek(sheet)}`)).doses].find(
      ({ tickFrom }) => Date.parse(tickFrom) > now().getTime(),
    );
    const path = { id: dose?.id ?? '' };
    const tick = { action: 'given', id: randomUUID(), planVersion: sheet.plan?.version };
    const tooEarly = await call('POST', '/api/doses/[id]/ticks', { cookie, path, body: tick });
    expect(tooEarly.status).toBe(409);
    const skipped = await call('POST', '/api/doses/[id]/ticks', { cookie, path, body: { ...tick, action: 'skipped' } });
    const after = weekSheetSchema.parse(await skipped.json());
    expect(after.doses.find(({ id }) => id === dose?.id)?.status).toBe('skipped');
    expect((await call('POST', '/api/doses/[id]/ticks', { cookie: viewer, path, body: tick })).status).toBe(403);
    const none = { id: randomUUID() };
    expect((await call('POST', '/api/doses/[id]/ticks', { cookie, path: none, body: tick })).status).toBe(404);
    const amiss = await call('POST', '/api/doses/[id]/ticks', { cookie, path, body: { ...tick, action: 'changed' } });
    expect(await problemPaths(amiss)).toEqual(['amount']);
  });
});

const nextWeek = ({ days }: WeekSheet) => days.at(-1)?.endsAt.slice(0, 10) ?? '';

describe('looking round over HTTP', { timeout: 120_000 }, () => {
  it('needs no account: the reply carries the cookie of a household of one’s own', async () => {
    const opened = await call('POST', '/api/look-round');
    expect(opened.status).toBe(200);
    expect(await opened.json()).toEqual({ next: '/week' });
    const cookie = cookieOf(opened.headers.get('set-cookie'));
    const sheet = weekSheetSchema.parse(await (await call('GET', '/api/week', { cookie })).json());
    expect(sheet.household).toMatchObject({ demo: true, name: 'Filao Road' });
    expect(sheet.plan).not.toBeNull();
    await call('POST', '/api/sign-out', { cookie });
    expect((await call('GET', '/api/week', { cookie })).status).toBe(401);
  });
});
