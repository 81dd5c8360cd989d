import 'server-only';
import { listValidMemberships } from '@/db/queries/memberships';
import { findPersonByEmail, findUnprovenByEmail } from '@/db/queries/people';
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
  const scope = systemScope('sign-in');
  // Whoever has the address, and whoever only gave it: the same work for both, and where there is neither.
  const candidates = [await findPersonByEmail(db, scope, email), await findUnprovenByEmail(db, scope, email)];
  const matches = await Promise.all(candidates.map((each) => verifyPassword(each?.passwordHash ?? null, password)));
  const person = candidates.find((_, at) => matches[at]);
  if (!person) throw new AppError('wrong-sign-in', 'This e-mail address and this password do not go together.');

  await forgetTries(visit, 'sign-in-email', email);
  return enterAs(visit, person.id);
}

/** Lets in somebody who has shown who they are, with a session of its own. */
export async function enterAs(visit: Visit, personId: string): Promise<Entered> {
  const [first] = await listValidMemberships(visit.db, personId, visit.now);
  await visit.enter(personId, first?.household.id ?? null);
  return { next: first && first.poolCompletedAt === null ? '/first-run' : '/week' };
}
