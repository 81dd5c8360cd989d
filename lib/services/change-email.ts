import 'server-only';
import { findAccount, findPersonByEmail, setEmail } from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { countTry } from '@/lib/auth/rate-limit';
import type { SignedIn } from '@/lib/auth/sessions';
import { systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Done, EmailChange } from '@/lib/schemas/account';
import { askForConfirmation } from './confirm-email';
import { confirmPassword } from './confirm-password';
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
  await confirmPassword(visit, { personId, password: current, path: 'current' });
  await countTry(visit, 'mail-person', personId);
  await inWriteTransaction(db, async (tx) => {
    const account = await findAccount(tx, personId);
    if (!account?.email || account.email === email) return;
    if (!sendsMail()) {
      if ((await setEmail(tx, { personId, email, confirmedAt: null })) === 'taken') {
        const message = 'Another account has this address.';
        throw new AppError('conflict', message, { problems: [{ path: 'email', message }] });
      }
      return;
    }
    const { name, language } = account;
    const letter = { about: 'changes', name, email } as const;
    // An address that was only given may be somebody else's, whom it does not concern.
    if (account.proven) await queueMail(tx, { letter, email: account.email, language, now, about: { personId } });
    const mute = (await findPersonByEmail(tx, systemScope('mail'), email)) !== null;
    await askForConfirmation(tx, { personId, name, email, language }, { purpose: 'change-email', now, mute });
  });
  deliverSoon(db);
  return { done: true };
}
