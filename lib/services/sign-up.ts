import 'server-only';
import { randomUUID } from 'node:crypto';
import { insertHousehold } from '@/db/queries/households';
import { insertMembership } from '@/db/queries/memberships';
import { insertPerson } from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { hashPassword, isCommonPassword } from '@/lib/auth/passwords';
import { countTry } from '@/lib/auth/rate-limit';
import { systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Entered, SignUp } from '@/lib/schemas/account';
import { languageOf } from '@/lib/schemas/languages';

/** Makes an account with a household of its own, whose owner the person is, and signs in. */
export async function signUp(visit: Visit, account: SignUp): Promise<Entered> {
  await countTry(visit, 'sign-up-address', visit.address);
  if (isCommonPassword(account.password))
    throw refusal('invalid-input', 'password', 'This password is one of those that are tried first. Choose another.');

  const { db, now } = visit;
  const scope = systemScope('sign-up');
  const personId = randomUUID();
  const householdId = randomUUID();
  const passwordHash = await hashPassword(account.password);
  const { name, email, householdName, timeZone, unitSystem, locale } = account;
  await inWriteTransaction(db, async (tx) => {
    const added = await insertPerson(tx, scope, {
      id: personId,
      name,
      email,
      passwordHash,
      language: languageOf(locale),
      createdAt: now,
    });
    if (added === 'taken')
      throw refusal('conflict', 'email', 'There is an account with this e-mail already. Sign in instead.');
    await insertHousehold(tx, scope, {
      id: householdId,
      name: householdName,
      timeZone,
      unitSystem,
      locale,
      createdAt: now,
    });
    await insertMembership(tx, scope, { id: randomUUID(), householdId, personId, role: 'owner', validFrom: now });
  });
  await visit.enter(personId, householdId);
  return { next: '/first-run' };
}

function refusal(code: 'invalid-input' | 'conflict', path: string, message: string): AppError {
  return new AppError(code, message, { problems: [{ path, message }] });
}
