import 'server-only';
import { listValidMemberships } from '@/db/queries/memberships';
import { findPersonByEmail } from '@/db/queries/people';
import { verifyPassword } from '@/lib/auth/passwords';
import { countTry, forgetTries } from '@/lib/auth/rate-limit';
import { systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Entered, SignIn } from '@/lib/schemas/account';

/** Signs a person in on this device, in the household joined first. */
export async function signIn(visit: Visit, { email, password }: SignIn): Promise<Entered> {
  await countTry(visit, 'sign-in-address', visit.address);
  await countTry(visit, 'sign-in-email', email);
  const { db } = visit;
  const person = await findPersonByEmail(db, systemScope('sign-in'), email);
  const matches = await verifyPassword(person?.passwordHash ?? null, password);
  if (!person || !matches)
    throw new AppError('wrong-sign-in', 'This e-mail address and this password do not go together.');

  await forgetTries(visit, 'sign-in-email', email);
  return enterAs(visit, person.id);
}

/** Lets in somebody who has shown who they are, with a session of its own. */
export async function enterAs(visit: Visit, personId: string): Promise<Entered> {
  const [first] = await listValidMemberships(visit.db, personId, visit.now);
  await visit.enter(personId, first?.household.id ?? null);
  return { next: first && first.poolCompletedAt === null ? '/first-run' : '/week' };
}
