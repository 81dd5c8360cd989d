import sharp from 'sharp';
import { beforeAll, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { photos } from '@/db/schema';
import { MOST_PHOTO_BYTES, photosSchema } from '@/lib/schemas/photo';
import { call, serveFreshDatabase, signedInAs } from '@/tests/support/api';
import { aHousehold } from '@/tests/support/test-database';

let db: Database;
let cookie: string;
let stranger: string;
beforeAll(async () => {
  db = serveFreshDatabase();
  cookie = await signedInAs(db, await aHousehold(db));
  stranger = await signedInAs(db, await aHousehold(db));
});

const id = crypto.randomUUID();
const picture = () =>
  sharp({ create: { width: 60, height: 40, channels: 3, background: 'teal' } })
    .jpeg()
    .toBuffer();
const send = (bytes: Uint8Array<ArrayBuffer>, headers: Record<string, string>, query = `?id=${id}&kind=equipment`) =>
  call('POST', '/api/photos', { cookie, bytes, headers, query });

it('keeps a file that is sent, and gives it out through the gate alone', async () => {
  const sent = await send(new Uint8Array(await picture()), { 'content-type': 'image/jpeg' });
  expect(sent.status).toBe(200);
  expect(photosSchema.parse(await sent.json())).toMatchObject([{ id, width: 60, height: 40 }]);

  const address = { path: { id }, query: '?size=whole' };
  const shown = await call('GET', '/api/photos/[id]', { cookie, ...address });
  expect(shown.headers.get('content-type')).toBe('image/webp');
  expect(shown.headers.get('cache-control')).toBe('private, no-cache');
  expect(shown.headers.get('x-content-type-options')).toBe('nosniff');
  expect((await sharp(Buffer.from(await shown.arrayBuffer())).metadata()).format).toBe('webp');

  const known = { 'if-none-match': shown.headers.get('etag') ?? '' };
  expect((await call('GET', '/api/photos/[id]', { cookie, ...address, headers: known })).status).toBe(304);
  // Whoever may no longer see it is not told that it has not changed.
  expect((await call('GET', '/api/photos/[id]', { cookie: stranger, ...address, headers: known })).status).toBe(404);
  expect((await call('GET', '/api/photos/[id]', { ...address, headers: known })).status).toBe(401);
});

it.each([
  ['JSON', 415, { 'content-type': 'application/json' }, undefined],
  ['a web page', 415, { 'content-type': 'text/html' }, undefined],
  ['no kind', 422, { 'content-type': 'image/png' }, `?id=${crypto.randomUUID()}`],
  ['an unknown kind', 422, { 'content-type': 'image/png' }, `?id=${crypto.randomUUID()}&kind=passport`],
  ['another id', 422, { 'content-type': 'image/png' }, '?id=../../etc&kind=equipment'],
  ['a strip of no test', 422, { 'content-type': 'image/png' }, `?id=${crypto.randomUUID()}&kind=strip`],
  ['a field too many', 422, { 'content-type': 'image/png' }, `?id=${crypto.randomUUID()}&kind=equipment&admin=1`],
])('refuses %s', async (_, status, headers, query) => {
  const before = await db.$count(photos);
  const answer = await send(new Uint8Array(await picture()), headers, query);
  expect(answer.status).toBe(status);
  expect(await answer.json()).toMatchObject({ error: { code: 'invalid-input' } });
  expect(await db.$count(photos)).toBe(before);
});

it('refuses more than 8 MB, whatever it is', async () => {
  const answer = await send(new Uint8Array(MOST_PHOTO_BYTES + 1), { 'content-type': 'image/jpeg' });
  expect(answer.status).toBe(413);
  expect(await answer.json()).toMatchObject({ error: { message: 'A picture may have 8 MB. Send a smaller one.' } });
});
