import 'server-only';
import { findPasswordHash } from '@/db/queries/people';
import { verifyPassword } from '@/lib/auth/passwords';
import { countTry, forgetTries } from '@/lib/auth/rate-limit';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';

/** `path` is the field in which the password was typed. */
type Asked = { personId: string; password: string; path: string };

/**
 * Asks for the password of an account once more, before what cannot be taken back.
 *
 * @returns the hash it was checked against, to be looked at again inside the transaction
 */
export async function confirmPassword(visit: Visit, { personId, password, path }: Asked): Promise<string> {
  await countTry(visit, 'password-person', personId);
  const hash = await findPasswordHash(visit.db, personId);
  if (!(await verifyPassword(hash, password)) || hash === null) {
    const message = 'This is not the password you have now.';
    throw new AppError('invalid-input', message, { problems: [{ path, message }] });
  }
  await forgetTries(visit, 'password-person', personId);
  return hash;
}
