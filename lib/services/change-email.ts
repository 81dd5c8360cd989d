import 'server-only';
import { findAccount, findPasswordHash, findPersonByEmail, setEmail } from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { verifyPassword } from '@/lib/auth/passwords';
import { countTry, forgetTries } from '@/lib/auth/rate-limit';
import type { SignedIn } from '@/lib/auth/sessions';
import { systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Done, EmailChange } from '@/lib/schemas/account';
import { askForConfirmation } from './confirm-email';
import { deliverSoon } from './deliver-mail';
import { queueMail, sendsMail } from './queue-mail';

/**
 * Another address, for whoever knows the password. Where mail leaves, it changes once the new one is confirmed, and the old
 * one is told; the answer does not say whether somebody else has it. Where none leaves, it changes at once.
 */
export async function changeEmail(
  visit: Visit & { signedIn: SignedIn },
  { current, email }: EmailChange,
): Promise<Done> {
  const { db, now, signedIn } = visit;
  const { personId } = signedIn;
  await countTry(visit, 'password-person', personId);
  if (!(await verifyPassword(await findPasswordHash(db, personId), current)))
    throw refusal('invalid-input', 'current', 'This is not the password you have now.');
  await forgetTries(visit, 'password-person', personId);
  await countTry(visit, 'mail-person', personId);
  await inWriteTransaction(db, async (tx) => {
    const account = await findAccount(tx, personId);
    if (!account?.email || account.email === email) return;
    if (!sendsMail()) {
      if ((await setEmail(tx, { personId, email, confirmedAt: null })) === 'taken')
        throw refusal('conflict', 'email', 'Another account has this address.');
      return;
    }
    const { name, language } = account;
    const letter = { about: 'changes', name, email } as const;
    await queueMail(tx, { letter, email: account.email, language, now, about: { personId } });
    const mute = (await findPersonByEmail(tx, systemScope('mail'), email)) !== null;
    await askForConfirmation(tx, { personId, name, email, language }, { purpose: 'change-email', now, mute });
  });
  deliverSoon(db);
  return { done: true };
}

function refusal(code: 'invalid-input' | 'conflict', path: string, message: string): AppError {
  return new AppError(code, message, { problems: [{ path, message }] });
}
