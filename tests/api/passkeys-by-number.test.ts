import { expect, it } from 'vitest';
import { call, serveFreshDatabase, signedInAs } from '@/tests/support/api';
import { aHousehold } from '@/tests/support/test-database';

const db = serveFreshDatabase();

it('says why there are no passkeys where the product is opened by a number, and makes none', async () => {
  const cookie = await signedInAs(db, await aHousehold(db));
  const listed = await call('GET', '/api/passkeys', { cookie });
  expect(await listed.json()).toEqual({ passkeys: [], obstacle: 'number' });
  const words = 'Wadewell is opened by a number here, and passkeys need a name. Sign in with your password.';
  const refusals = [
    await call('POST', '/api/passkeys/options', { cookie, body: { password: 'larch water evening' } }),
    await call('POST', '/api/sign-in/passkey/options'),
  ];
  for (const refused of refusals) {
    expect(refused.status).toBe(403);
    expect(await refused.json()).toMatchObject({ error: { message: words } });
  }
});
