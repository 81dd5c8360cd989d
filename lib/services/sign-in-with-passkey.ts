import 'server-only';
import { findPasskey, keepPasskeyUse } from '@/db/queries/passkeys';
import { askForPasskey, ownPasskeyPlace, proveHolder } from '@/lib/auth/passkeys';
import { countTry } from '@/lib/auth/rate-limit';
import { systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Entered } from '@/lib/schemas/account';
import type { PasskeyRequest, PasskeySignIn } from '@/lib/schemas/passkey';
import { keepChallenge, takeChallenge } from './passkey-challenge';
import { enterAs } from './sign-in';

/** What to ask of a device that is to sign somebody in. */
export async function askToSignIn(visit: Visit): Promise<PasskeyRequest> {
  const place = ownPasskeyPlace();
  await countTry(visit, 'passkey-address', visit.address);
  const asked = await askForPasskey(place);
  await keepChallenge(visit, asked.challenge, null);
  return asked;
}

/** Signs in whoever holds a passkey, in the household joined first. Whatever is wrong with it is said in one sentence. */
export async function signInWithPasskey(visit: Visit, answer: PasskeySignIn): Promise<Entered> {
  const place = ownPasskeyPlace();
  await countTry(visit, 'passkey-address', visit.address);
  const { db, now } = visit;
  const scope = systemScope('sign-in');
  const challenge = await takeChallenge(visit, answer, null);
  const kept = await findPasskey(db, scope, answer.id);
  const held = challenge === null || kept === null ? null : await proveHolder(place, challenge, kept, answer);
  if (kept === null || held === null || !(await keepPasskeyUse(db, scope, { id: kept.id, ...held, at: now })))
    throw new AppError(
      'wrong-sign-in',
      'This passkey does not open a sheet here. Sign in with your e-mail address and your password.',
    );
  return enterAs(visit, kept.personId);
}
