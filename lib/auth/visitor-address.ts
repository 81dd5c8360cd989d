import 'server-only';
import { randomBytes } from 'node:crypto';
import { subscribe } from 'node:diagnostics_channel';
import type { IncomingMessage } from 'node:http';
import { isIP } from 'node:net';
import type { TrustedProxies } from '@/lib/env';

/**
 * What the socket says, handed from the server to routes and pages beside what the visitor sent. Next.js shows them no
 * socket, and leaves an `x-forwarded-for` that a visitor has made up as it is.
 */
export const socketHeader = 'x-wadewell-socket';

// Every bundle of the process has a copy of this file; all of them know one mark, and nobody outside knows it.
const shared = globalThis as { wadewellSocketMark?: string; wadewellSocketNoted?: boolean };
const mark = () => (shared.wadewellSocketMark ??= randomBytes(24).toString('base64url'));

/** Notes on each request from which address it came, whatever it said itself. Node.js tells of it before the server does. */
export function noteSockets(): void {
  if (shared.wadewellSocketNoted) return;
  shared.wadewellSocketNoted = true;
  subscribe('http.server.request.start', (message) => {
    const { request } = message as { request: IncomingMessage };
    request.headers[socketHeader] = socketNote(request.socket.remoteAddress ?? '');
  });
}

/** The note on one request. A request without it came before anybody listened. */
export function socketNote(address: string): string {
  return `${mark()} ${address}`;
}

/**
 * Network address of whoever asks: that of the socket, or what the proxies in front say, counted from the right, where the
 * socket's is one of theirs. Everything left of that is what the visitor claims. 'unknown' when no socket is known.
 */
export function visitorAddress(headers: Headers, trusted: TrustedProxies | null): string {
  const note = headers.get(socketHeader) ?? '';
  const socket = note.startsWith(`${mark()} `) ? plainAddress(note.slice(mark().length + 1)) : undefined;
  if (socket === undefined) return 'unknown';
  if (trusted === null) return socket;
  let address = socket;
  const forwarded = headers.get('x-forwarded-for')?.split(',') ?? [];
  for (const [hops, entry] of forwarded.toReversed().entries()) {
    if (!trusted.isProxy(address, hops)) break;
    const next = plainAddress(entry.trim());
    // What is no address was not written by a proxy: the nearest one that is known counts.
    if (next === undefined) break;
    address = next;
  }
  return address;
}

/** What is counted for an address: of IPv6 the network, because whoever has one address there has all of it. */
export function countedAddress(address: string): string {
  return isIP(address) === 6 ? `${groupsOf(address).slice(0, 4).join(':')}::/64` : address;
}

/** An address without port, zone and brackets, IPv4 in its own form; undefined for what is none. */
function plainAddress(entry: string): string | undefined {
  const bare = /^\[([^\]]+)\](?::\d+)?$/.exec(entry)?.[1] ?? /^([\d.]+)(?::\d+)?$/.exec(entry)?.[1] ?? entry;
  const address = bare.replace(/%.*$/, '').toLowerCase();
  const inside = /^::ffff:([\d.]+)$/.exec(address)?.[1] ?? address;
  return isIP(inside) === 0 ? undefined : inside;
}

function groupsOf(address: string): string[] {
  // A dotted end takes the place of two groups, which are not among the first four.
  const [head = '', tail] = address.replace(/[\d.]+\.\d+$/, '0:0').split('::');
  const before = head === '' ? [] : head.split(':');
  const after = tail === undefined || tail === '' ? [] : tail.split(':');
  const middle = Array.from({ length: Math.max(0, 8 - before.length - after.length) }, () => '0');
  return [...before, ...middle, ...after].map((group) => group.replace(/^0+(?=.)/, ''));
}
