import { beforeAll, describe, expect, it } from 'vitest';
import type { Database } from '@/db/client';
import { auditTrail } from '@/db/schema';
import { call, routePatterns, serveFreshDatabase, signedInAs, writeMethods } from '@/tests/support/api';
import { aHousehold, aMember } from '@/tests/support/test-database';

/** Writes that are about a person or a device and about no household. */
const ofThePerson = [
  '/api/sign-up',
  '/api/sign-in',
  '/api/sign-out',
  '/api/look-round',
  '/api/language',
  '/api/tour',
  '/api/account',
  '/api/account/email',
  '/api/account/confirmation',
  '/api/account/password',
  '/api/email-confirmations',
  '/api/password-resets',
  '/api/sessions',
  '/api/sessions/[id]',
  '/api/passkeys',
  '/api/passkeys/options',
  '/api/passkeys/[id]',
  '/api/sign-in/passkey',
  '/api/sign-in/passkey/options',
  '/api/invitations/accept',
  '/api/invitations/sign-up',
  '/api/households/chosen',
];
/** What answers when no route does. */
const unknown = '/api/[...path]';

// Every route of app/api is here by itself: one that is added later is asked too.
const writes = routePatterns
  .filter((pattern) => pattern !== unknown && !ofThePerson.includes(pattern))
  .flatMap((pattern) => writeMethods.map((method) => ({ method, pattern })));
const path = { productId: 'gran', readingId: crypto.randomUUID(), doseId: crypto.randomUUID(), day: '2026-07-05' };

/**
 * Whoever belongs to a household may leave it, and may say yes or no when they are asked to look after it (whom else they
 * may remove, and whose hand-over it is, is looked at by the service); anybody with an account may make one of their own.
 */
const ofEveryMember = [
  'DELETE /api/members/[id]',
  'DELETE /api/hand-overs/[id]',
  'PUT /api/hand-overs/[id]/agreement',
  'POST /api/households',
];
const forEveryMember = ({ method, pattern }: (typeof writes)[number]) => ofEveryMember.includes(`${method} ${pattern}`);

describe('a write', () => {
  let db: Database;
  let viewer: string;
  beforeAll(async () => {
    db = serveFreshDatabase();
    const owner = await aHousehold(db);
    const { householdId } = owner;
    viewer = await signedInAs(
      db,
      await aMember(db, { householdId, role: 'viewer', now: new Date('2026-07-05T12:00:00Z') }),
    );
  });

  it('exists for pool, shelf and household', () => {
    expect(routePatterns).toEqual(expect.arrayContaining(['/api/pool', '/api/shelf-products', '/api/households']));
  });

  it.each(writes.filter((write) => !forEveryMember(write)))(
    'is not for a viewer: $method $pattern',
    async ({ method, pattern }) => {
      const response = await call(method, pattern, { cookie: viewer, body: {}, path });
      // 405: there is no such write.
      expect([403, 405]).toContain(response.status);
      expect(await db.$count(auditTrail)).toBe(0);
    },
  );

  it.each(writes)('is not for somebody who is signed out: $method $pattern', async ({ method, pattern }) => {
    expect([401, 405]).toContain((await call(method, pattern, { body: {}, path })).status);
  });

  it.each(writes)('is not for another site: $method $pattern', async ({ method, pattern }) => {
    const crossSite = { 'sec-fetch-site': 'cross-site', origin: 'https://elsewhere.example' };
    const response = await call(method, pattern, { cookie: viewer, body: {}, path, headers: crossSite });
    expect([403, 405]).toContain(response.status);
  });
});
