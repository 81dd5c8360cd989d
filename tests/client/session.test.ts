import { afterEach, expect, it, vi } from 'vitest';
import { signIn } from '@/lib/client/session';

afterEach(() => vi.unstubAllGlobals());

const entry = { email: 'ines@pool.example', password: 'eleven green frogs' };

it.each(['https://elsewhere.example', '//elsewhere.example', 'week', '', 7])(
  'goes nowhere but to our own pages: %j',
  async (next) => {
    vi.stubGlobal('fetch', () => Promise.resolve(Response.json({ next })));
    await expect(signIn(entry)).rejects.toMatchObject({ code: 'unexpected' });
  },
);

it('goes where the server says', async () => {
  vi.stubGlobal('fetch', () => Promise.resolve(Response.json({ next: '/first-run' })));
  await expect(signIn(entry)).resolves.toEqual({ next: '/first-run' });
});
