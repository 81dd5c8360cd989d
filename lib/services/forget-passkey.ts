import 'server-only';
import { deletePasskey } from '@/db/queries/passkeys';
import type { SignedIn } from '@/lib/auth/sessions';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { PasskeyList } from '@/lib/schemas/passkey';
import { showPasskeys } from './show-passkeys';

/** From now on nobody signs in with this passkey of theirs. */
export async function forgetPasskey(
  visit: Visit & { signedIn: SignedIn },
  { id }: { id: string },
): Promise<PasskeyList> {
  if (!(await deletePasskey(visit.db, { personId: visit.signedIn.personId, id })))
    throw new AppError('not-found', 'This passkey is not one of yours, or no longer.');
  return showPasskeys(visit);
}
