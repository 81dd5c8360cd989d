import { expect, it } from 'vitest';
import { passkeyPlace } from '@/lib/auth/passkey-place';

it.each([
  ['http://localhost:3000', 'localhost'],
  ['https://localhost:3000', 'localhost'],
  ['https://pool.example', 'pool.example'],
  ['https://pool.example:8443', 'pool.example'],
])('passkeys can be had at %s, for %s', (origin, rpId) => {
  expect(passkeyPlace(origin)).toEqual({ rpId, origin });
});

it.each([
  ['http://127.0.0.1:3000', 'number'],
  ['https://192.168.1.20', 'number'],
  ['http://[::1]:3000', 'number'],
  ['https://[2001:db8::7]', 'number'],
  // Another spelling of 127.0.0.1.
  [new URL('https://2130706433').origin, 'number'],
  ['http://pool.example', 'in-the-clear'],
  ['http://localhost.pool.example', 'in-the-clear'],
])('passkeys cannot be had at %s: %s', (origin, obstacle) => {
  expect(passkeyPlace(origin)).toEqual({ obstacle });
});
