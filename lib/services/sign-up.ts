import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from '@/db/client';
import { insertPerson, insertUnprovenAccount } from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { hashPassword, isCommonPassword } from '@/lib/auth/passwords';
import { countTry, refuseWhenUsedUp } from '@/lib/auth/rate-limit';
import { systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Entered, InvitedSignUp, SignUp } from '@/lib/schemas/account';
import { languageOf } from '@/lib/schemas/languages';
import { askForConfirmation } from './confirm-email';
import { deliverSoon } from './deliver-mail';
import { useInvitation } from './join-household';
import { addHousehold } from './make-household';
import { sendsMail } from './queue-mail';

/** Makes an account with a household of its own, whose owner the person is, and signs in. */
export async function signUp(visit: Visit, account: SignUp): Promise<Entered> {
  let householdId: string | null = null;
  const { householdName: name, timeZone, unitSystem, locale } = account;
  const personId = await addPerson(visit, account, async (tx, owner) => {
    householdId = await addHousehold(tx, { name, timeZone, unitSystem, locale }, { owner, now: visit.now });
  });
  await visit.enter(personId, householdId);
  return { next: '/first-run' };
}

/** Makes an account for somebody who was invited, uses the invitation up, and signs in: all of it or nothing. */
export async function signUpInvited(visit: Visit, { token, ...account }: InvitedSignUp): Promise<Entered> {
  let householdId: string | null = null;
  const personId = await addPerson(visit, account, async (tx, person) => {
    householdId = await useInvitation(tx, { token, personId: person, now: visit.now });
  });
  await visit.enter(personId, householdId);
  return { next: '/week' };
}

type Account = Pick<SignUp, 'name' | 'email' | 'password' | 'locale'>;

/**
 * Writes a person and whatever belongs to them, in one transaction. Where mail leaves, the answer is the same whether
 * somebody has the address or not: the account is made, and the address is its own once the link in the mail was opened,
 * which whoever has it does not get. Where none leaves, nobody could ever show that: the first who signs up has it, and the
 * answer tells, a few times an hour.
 *
 * @returns the person's id
 */
async function addPerson(
  visit: Visit,
  { name, email, password, locale }: Account,
  further: (tx: Transaction, personId: string) => Promise<void>,
): Promise<string> {
  await countTry(visit, 'sign-up-address', visit.address);
  await countTry(visit, 'sign-up-email', email);
  await refuseWhenUsedUp(visit, 'taken-address', visit.address);
  if (isCommonPassword(password))
    throw refusal('invalid-input', 'password', 'This password is one of those that are tried first. Choose another.');
  const { db, now } = visit;
  const personId = randomUUID();
  const passwordHash = await hashPassword(password);
  const scope = systemScope('sign-up');
  const added = await inWriteTransaction(db, async (tx) => {
    const person = { personId, name, email, language: languageOf(locale) };
    const row = { id: personId, name, language: person.language, createdAt: now };
    if (sendsMail()) {
      await insertPerson(tx, scope, row);
      await insertUnprovenAccount(tx, scope, { personId, email, passwordHash, createdAt: now });
    } else if ((await insertPerson(tx, scope, { ...row, email, passwordHash })) === 'taken') return false;
    await further(tx, personId);
    await askForConfirmation(tx, person, { purpose: 'confirm-email', now });
    return true;
  });
  if (!added) {
    await countTry(visit, 'taken-address', visit.address);
    throw refusal('conflict', 'email', 'There is an account with this e-mail already. Sign in instead.');
  }
  deliverSoon(db);
  return personId;
}

function refusal(code: 'invalid-input' | 'conflict', path: string, message: string): AppError {
  return new AppError(code, message, { problems: [{ path, message }] });
}
