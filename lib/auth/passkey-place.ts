import { isIP } from 'node:net';
import type { PasskeyObstacle } from '@/lib/schemas/passkey';

/** Where passkeys belong to: browsers bind each to the name of the host that it was made under. */
export type PasskeyPlace = { rpId: string; origin: string };

/**
 * Whether passkeys can be had at an origin. A number is no name to bind one to, and browsers make none for a page that
 * came in the clear, but for this machine's own name.
 */
export function passkeyPlace(origin: string): PasskeyPlace | { obstacle: PasskeyObstacle } {
  const { hostname, protocol } = new URL(origin);
  if (isIP(hostname.replace(/^\[|\]$/g, '')) !== 0) return { obstacle: 'number' };
  if (protocol !== 'https:' && hostname !== 'localhost') return { obstacle: 'in-the-clear' };
  return { rpId: hostname, origin };
}
