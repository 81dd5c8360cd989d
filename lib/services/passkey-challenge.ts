import 'server-only';
import {
  consumePasskeyChallenge,
  deleteExpiredPasskeyChallenges,
  insertPasskeyChallenge,
} from '@/db/queries/passkey-challenges';
import { inWriteTransaction } from '@/db/write';
import { challengeIn, challengeMilliseconds } from '@/lib/auth/passkeys';
import { systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';

const digestOf = (visit: Visit, challenge: string) => visit.keyOf('passkey-challenge', challenge);

/** Keeps what a device is asked, until it answers or the time is over; null for signing in, where nobody is known yet. */
export async function keepChallenge(visit: Visit, challenge: string, personId: string | null): Promise<void> {
  const { db, now } = visit;
  const expiresAt = new Date(now.getTime() + challengeMilliseconds);
  await inWriteTransaction(db, async (tx) => {
    // A server that runs for months is not to keep what nobody answered.
    await deleteExpiredPasskeyChallenges(tx, systemScope('clean-up'), now);
    await insertPasskeyChallenge(tx, { digest: digestOf(visit, challenge), personId, expiresAt });
  });
}

/** The challenge that an answer is for, which is used up by it, right or wrong; null when it is not open to this person. */
export async function takeChallenge(
  visit: Visit,
  answer: { clientDataJSON: string },
  personId: string | null,
): Promise<string | null> {
  const challenge = challengeIn(answer);
  if (challenge === null) return null;
  const digest = digestOf(visit, challenge);
  return (await consumePasskeyChallenge(visit.db, { digest, personId, now: visit.now })) ? challenge : null;
}
