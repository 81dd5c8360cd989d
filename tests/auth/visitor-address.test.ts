import { channel } from 'node:diagnostics_channel';
import { describe, expect, it } from 'vitest';
import { countedAddress, noteSockets, socketHeader, socketNote, visitorAddress } from '@/lib/auth/visitor-address';
import { readEnvironment } from '@/lib/env';

const trusting = (TRUSTED_PROXIES?: string) => readEnvironment({ NODE_ENV: 'test', TRUSTED_PROXIES }).trustedProxies;

/** What is made of a request by a socket, with what it says of itself. */
const addressOf = (socket: string, forwarded: string | undefined, proxies?: string) => {
  const said = forwarded === undefined ? {} : { 'x-forwarded-for': forwarded };
  return visitorAddress(new Headers({ [socketHeader]: socketNote(socket), ...said }), trusting(proxies));
};

describe('the address of a visitor', () => {
  it.each([
    ['no proxy: what is claimed counts for nothing', '203.0.113.9', '198.51.100.1', undefined, '203.0.113.9'],
    ['one proxy: what it wrote', '127.0.0.1', '198.51.100.1', '1', '198.51.100.1'],
    [
      'one proxy: what it wrote, not what was claimed before it',
      '127.0.0.1',
      '1.1.1.1, 198.51.100.1',
      '1',
      '198.51.100.1',
    ],
    ['two proxies', '127.0.0.1', '1.1.1.1, 198.51.100.1, 10.0.0.2', '2', '198.51.100.1'],
    ['a proxy that wrote nothing', '127.0.0.1', undefined, '1', '127.0.0.1'],
    ['what is no address', '127.0.0.1', 'me', '1', '127.0.0.1'],
    ['what is no address further out', '127.0.0.1', 'me, 198.51.100.1', '2', '198.51.100.1'],
    ['a listed proxy', '10.0.0.9', '1.1.1.1, 198.51.100.1', '10.0.0.0/8', '198.51.100.1'],
    ['a chain of listed ones', '10.0.0.9', '1.1.1.1, 198.51.100.1, 192.0.2.7', '10.0.0.0/8, 192.0.2.7', '198.51.100.1'],
    ['somebody who is no listed proxy', '203.0.113.9', '198.51.100.1', '10.0.0.0/8', '203.0.113.9'],
    ['IPv6, listed', '::1', '2001:db8::5', '::1', '2001:db8::5'],
    ['a port beside it', '127.0.0.1', '198.51.100.1:4711', '1', '198.51.100.1'],
    ['a port beside IPv6', '127.0.0.1', '[2001:db8::5]:4711', '1', '2001:db8::5'],
    ['IPv4 in the clothes of IPv6', '::ffff:203.0.113.9', undefined, undefined, '203.0.113.9'],
  ])('%s', (_, socket, forwarded, proxies, address) => {
    expect(addressOf(socket, forwarded, proxies)).toBe(address);
  });

  it('is not known where nobody noted the socket, whatever the visitor says', () => {
    const claims = { 'x-forwarded-for': '198.51.100.1', [socketHeader]: 'guess 198.51.100.1' };
    expect(visitorAddress(new Headers(claims), null)).toBe('unknown');
    expect(visitorAddress(new Headers(claims), trusting('1'))).toBe('unknown');
  });

  it('is noted over what a request claims to have noted', () => {
    noteSockets();
    const request = { headers: { [socketHeader]: 'claimed' }, socket: { remoteAddress: '203.0.113.9' } };
    channel('http.server.request.start').publish({ request });
    expect(visitorAddress(new Headers(request.headers), null)).toBe('203.0.113.9');
  });

  it.each(['0', '11', '-1', 'me', '10.0.0.0/33', '10.0.0.0/0', '10.0.0.1,', '1.5', '10.0.0.300'])(
    'refuses to start with TRUSTED_PROXIES=%s',
    (value) => {
      expect(() => trusting(value)).toThrow('TRUSTED_PROXIES is how many proxies');
    },
  );

  it('is counted by the network in IPv6, where whoever has one address has them all', () => {
    expect(countedAddress('2001:db8:0:12::5')).toBe(countedAddress('2001:0db8::12:1:2:3:4'));
    expect(countedAddress('2001:db8:0:13::5')).not.toBe(countedAddress('2001:db8:0:12::5'));
    expect(countedAddress('64:ff9b::192.0.2.1')).toBe('64:ff9b:0:0::/64');
    expect(countedAddress('::1')).toBe('0:0:0:0::/64');
    expect(countedAddress('203.0.113.9')).toBe('203.0.113.9');
  });
});
