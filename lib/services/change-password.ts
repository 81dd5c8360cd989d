import 'server-only';
import { findAccount, setPasswordHash } from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { hashPassword, isCommonPassword } from '@/lib/auth/passwords';
import type { SignedIn } from '@/lib/auth/sessions';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Done, PasswordChange } from '@/lib/schemas/account';
import { confirmPassword } from './confirm-password';
import { deliverSoon } from './deliver-mail';
import { queueMail } from './queue-mail';

/** Another password, for whoever knows the one before; every other device is signed out by it. */
export async function changePassword(
  visit: Visit & { signedIn: SignedIn },
  { current, password }: PasswordChange,
): Promise<Done> {
  const { db, now } = visit;
  const { personId } = visit.signedIn;
  await confirmPassword(visit, { personId, password: current, path: 'current' });
  if (isCommonPassword(password)) {
    const message = 'This password is one of those that are tried first. Choose another.';
    throw new AppError('invalid-input', message, { problems: [{ path: 'password', message }] });
  }
  const passwordHash = await hashPassword(password);
  await inWriteTransaction(db, async (tx) => {
    await setPasswordHash(tx, personId, passwordHash);
    const account = await findAccount(tx, personId);
    if (!account?.email) return;
    const { name, email, language } = account;
    await queueMail(tx, { letter: { about: 'password', name }, email, language, now, about: { personId } });
  });
  deliverSoon(db);
  await visit.leaveElsewhere();
  return { done: true };
}

/** Signs out on every device but this one. */
export async function signOutElsewhere(visit: Visit): Promise<Done> {
  await visit.leaveElsewhere();
  return { done: true };
}
