import 'server-only';
import { randomBytes } from 'node:crypto';
import { hash, verify } from '@node-rs/argon2';
import { dictionary } from '@zxcvbn-ts/language-common';

/**
 * Argon2id, 19 MiB, two passes, one lane: the smallest of the settings that OWASP's password storage cheat sheet
 * recommends. The package's own default algorithm is Argon2id; its enum cannot be named under isolatedModules.
 */
const settings = { memoryCost: 19_456, timeCost: 2, parallelism: 1, outputLen: 32 };

/** One spelling for one password, whichever keyboard composed its accents. */
const spelled = (password: string) => password.normalize('NFKC');

export function hashPassword(password: string): Promise<string> {
  return hash(spelled(password), settings);
}

let dummy: Promise<string> | undefined;

/**
 * Whether the password belongs to the hash. Without a hash (nobody has this e-mail) the same work is done, so that the
 * time of the answer does not tell who has an account.
 */
export async function verifyPassword(passwordHash: string | null, password: string): Promise<boolean> {
  dummy ??= hash(randomBytes(32), settings);
  const against = await dummy;
  const matches = await verify(passwordHash ?? against, spelled(password));
  return passwordHash !== null && matches;
}

let common: Set<string> | undefined;

/** Whether it is one of the passwords that are tried first. */
export function isCommonPassword(password: string): boolean {
  common ??= new Set(dictionary['passwords-common']);
  return common.has(spelled(password).toLowerCase());
}
