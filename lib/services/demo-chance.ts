import 'server-only';
import { normalQuantile } from '@/lib/projection/normal';

const seed = 20_260_705;

/** A number from 0 to 1, both excluded, that is always the same for the same thing on the same day. */
export function chanceOf(what: string, day: number): number {
  let hash = seed;
  for (const character of `${what} ${day}`) hash = mixed(hash ^ (character.codePointAt(0) ?? 0));
  return (mixed(hash) + 0.5) / 2 ** 32;
}

/** The same as a draw from the standard normal distribution. */
export function normalOf(what: string, day: number): number {
  return normalQuantile(chanceOf(what, day));
}

/** Spreads the bits of a whole number over 32: the finisher of a well-known hash function (MurmurHash3, public domain). */
function mixed(value: number): number {
  let hash = value >>> 0;
  hash = Math.imul(hash ^ (hash >>> 16), 0x85ebca6b);
  hash = Math.imul(hash ^ (hash >>> 13), 0xc2b2ae35);
  return (hash ^ (hash >>> 16)) >>> 0;
}
