import 'server-only';
import type { Database } from '@/db/client';
import { setTourClosed } from '@/db/queries/people';
import type { SignedIn } from '@/lib/auth/sessions';
import type { Done } from '@/lib/schemas/account';

type PersonContext = { db: Database; now: Date; signedIn: SignedIn };

/** The notes on the first sheet are read: whoever closed them never sees them again, on any device. */
export async function closeTour({ db, now, signedIn }: PersonContext): Promise<Done> {
  await setTourClosed(db, signedIn.personId, now);
  return { done: true };
}
