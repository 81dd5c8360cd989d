import 'server-only';
import { findAccount, findPasswordHash, setPasswordHash } from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { hashPassword, isCommonPassword, verifyPassword } from '@/lib/auth/passwords';
import { countTry, forgetTries } from '@/lib/auth/rate-limit';
import type { SignedIn } from '@/lib/auth/sessions';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Done, PasswordChange } from '@/lib/schemas/account';
import { deliverSoon } from './deliver-mail';
import { queueMail } from './queue-mail';

/** Another password, for whoever knows the one before; every other device is signed out by it. */
export async function changePassword(
  visit: Visit & { signedIn: SignedIn },
  { current, password }: PasswordChange,
): Promise<Done> {
  const { db, now, signedIn } = visit;
  await countTry(visit, 'password-person', signedIn.personId);
  const hash = await findPasswordHash(db, signedIn.personId);
  if (!(await verifyPassword(hash, current))) throw refusal('current', 'This is not the password you have now.');
  if (isCommonPassword(password))
    throw refusal('password', 'This password is one of those that are tried first. Choose another.');
  const passwordHash = await hashPassword(password);
  await inWriteTransaction(db, async (tx) => {
    await setPasswordHash(tx, signedIn.personId, passwordHash);
    const account = await findAccount(tx, signedIn.personId);
    if (!account?.email) return;
    const { name, email, language } = account;
    const letter = { about: 'password', name } as const;
    await queueMail(tx, { letter, email, language, now, about: { personId: signedIn.personId } });
  });
  deliverSoon(db);
  await forgetTries(visit, 'password-person', signedIn.personId);
  await visit.leaveElsewhere();
  return { done: true };
}

/** Signs out on every device but this one. */
export async function signOutElsewhere(visit: Visit): Promise<Done> {
  await visit.leaveElsewhere();
  return { done: true };
}

function refusal(path: string, message: string): AppError {
  return new AppError('invalid-input', message, { problems: [{ path, message }] });
}
