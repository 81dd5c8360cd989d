import 'server-only';
import { setPasswordHash } from '@/db/queries/people';
import { hashPassword, isCommonPassword } from '@/lib/auth/passwords';
import type { SignedIn } from '@/lib/auth/sessions';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Done, PasswordChange } from '@/lib/schemas/account';
import { confirmPassword } from './confirm-password';

/** Another password, for whoever knows the one before; every other device is signed out by it. */
export async function changePassword(
  visit: Visit & { signedIn: SignedIn },
  { current, password }: PasswordChange,
): Promise<Done> {
  const { personId } = visit.signedIn;
  await confirmPassword(visit, { personId, password: current, path: 'current' });
  if (isCommonPassword(password)) {
    const message = 'This password is one of those that are tried first. Choose another.';
    throw new AppError('invalid-input', message, { problems: [{ path: 'password', message }] });
  }
  await setPasswordHash(visit.db, personId, await hashPassword(password));
  await visit.leaveElsewhere();
  return { done: true };
}

/** Signs out on every device but this one. */
export async function signOutElsewhere(visit: Visit): Promise<Done> {
  await visit.leaveElsewhere();
  return { done: true };
}
