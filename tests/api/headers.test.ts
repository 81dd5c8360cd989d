import { NextRequest } from 'next/server';
import { beforeEach, describe, expect, it, vi } from 'vitest';

// The environment is read once in a process, so each origin gets modules of its own.
beforeEach(() => {
  vi.resetModules();
  vi.unstubAllEnvs();
});

async function answered(origin: string, path: string) {
  vi.stubEnv('APP_ORIGIN', origin);
  const { proxy } = await import('@/proxy');
  return proxy(new NextRequest(`${origin}${path}`)).headers;
}
const http = 'http://127.0.0.1:3000';
const https = 'https://pool.example';

describe('a page', () => {
  it.each(['/', '/week', '/sign-in', '/no/such/page.png'])(
    'carries a policy with a nonce that Next.js gets too: %s',
    async (path) => {
      const headers = await answered(http, path);
      const policy = headers.get('content-security-policy') ?? '';
      const nonce = /script-src 'self' 'nonce-([^']+)' 'strict-dynamic'/.exec(policy)?.[1];
      expect(nonce).toMatch(/^[A-Za-z0-9+/=]{40,}$/);
      expect(policy).toContain(`style-src 'self' 'nonce-${nonce}'`);
      expect(policy).not.toMatch(/script-src[^;]*unsafe/);
      expect(headers.get('x-middleware-request-content-security-policy')).toBe(policy);
      expect(headers.get('x-frame-options')).toBe('DENY');
      expect(headers.get('x-content-type-options')).toBe('nosniff');
    },
  );

  it('has another nonce each time', async () => {
    const policies = [await answered(http, '/'), await answered(http, '/')].map((headers) =>
      headers.get('content-security-policy'),
    );
    expect(policies[0]).not.toBe(policies[1]);
  });

  it('promises https only where it is spoken', async () => {
    const plain = await answered(http, '/');
    expect(plain.get('strict-transport-security')).toBeNull();
    expect(plain.get('content-security-policy')).not.toContain('upgrade-insecure-requests');
    vi.resetModules();
    const secure = await answered(https, '/');
    expect(secure.get('strict-transport-security')).toMatch(/^max-age=\d{8,}/);
    expect(secure.get('content-security-policy')).toContain('upgrade-insecure-requests');
  });
});

describe('/api', () => {
  it('is no page: nothing of it runs or is kept', async () => {
    const headers = await answered(http, '/api/pool');
    expect(headers.get('content-security-policy')).toMatch(/^default-src 'none'/);
    expect(headers.get('cache-control')).toBe('no-store');
    expect(headers.get('x-content-type-options')).toBe('nosniff');
    expect(headers.get('strict-transport-security')).toBeNull();
  });

  it('promises https as the pages do', async () => {
    expect((await answered(https, '/api/pool')).get('strict-transport-security')).not.toBeNull();
  });
});
