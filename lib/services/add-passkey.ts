import 'server-only';
import { countPasskeys, insertPasskey, listPasskeys } from '@/db/queries/passkeys';
import { findAccount } from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { askForNewPasskey, ownPasskeyPlace, proveNewPasskey } from '@/lib/auth/passkeys';
import type { SignedIn } from '@/lib/auth/sessions';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { NewPasskey, PasskeyCreation, PasskeyList, PasskeyWish } from '@/lib/schemas/passkey';
import { MOST_PASSKEYS } from '@/lib/schemas/passkey-limits';
import { confirmPassword } from './confirm-password';
import { deliverSoon } from './deliver-mail';
import { keepChallenge, takeChallenge } from './passkey-challenge';
import { queueMail } from './queue-mail';
import { showPasskeys } from './show-passkeys';

type PersonVisit = Visit & { signedIn: SignedIn };

const enough = `You have ${MOST_PASSKEYS} passkeys, which is as many as can be kept. Forget one, then add this one.`;

/** What to ask of a device for another passkey, for whoever knows the password. */
export async function askForPasskeyOf(visit: PersonVisit, { password }: PasskeyWish): Promise<PasskeyCreation> {
  const place = ownPasskeyPlace();
  const { db, signedIn } = visit;
  const { personId } = signedIn;
  const account = await findAccount(db, personId);
  // A visitor of the demo is gone after a day, and has no password that a passkey could stand for.
  if (!account?.email || account.passwordHash === null)
    throw new AppError('not-allowed', 'A look round has no account, so it has no passkeys.');
  await confirmPassword(visit, { personId, password, path: 'password' });
  const known = await listPasskeys(db, personId);
  if (known.length >= MOST_PASSKEYS) throw new AppError('conflict', enough);
  const { name, email } = account;
  const asked = await askForNewPasskey(place, { personId, name, email }, known);
  await keepChallenge(visit, asked.challenge, personId);
  return asked;
}

/** Keeps the passkey that a device made, if it was asked for it by this person just now. */
export async function addPasskey(visit: PersonVisit, made: NewPasskey): Promise<PasskeyList> {
  const place = ownPasskeyPlace();
  const { db, now, signedIn } = visit;
  const { personId } = signedIn;
  const challenge = await takeChallenge(visit, made, personId);
  const proven = challenge === null ? null : await proveNewPasskey(place, challenge, made);
  if (proven === null)
    throw new AppError('conflict', 'This passkey could not be checked, or it took too long. Begin again.');
  await inWriteTransaction(db, async (tx) => {
    if ((await countPasskeys(tx, personId)) >= MOST_PASSKEYS) throw new AppError('conflict', enough);
    const row = { ...proven, personId, name: made.name, createdAt: now };
    if (!(await insertPasskey(tx, row)))
      throw new AppError('conflict', 'This passkey is known already. Make another one.');
    const account = await findAccount(tx, personId);
    if (!account?.email) return;
    const { name, email, language } = account;
    const letter = { about: 'passkey', name, passkey: made.name } as const;
    await queueMail(tx, { letter, email, language, now, about: { personId } });
  });
  deliverSoon(db);
  return showPasskeys(visit);
}
