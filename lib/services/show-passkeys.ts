import 'server-only';
import { listPasskeys } from '@/db/queries/passkeys';
import { passkeyPlace } from '@/lib/auth/passkey-place';
import type { SignedIn } from '@/lib/auth/sessions';
import type { Visit } from '@/lib/auth/visit';
import { environment } from '@/lib/env';
import type { PasskeyList } from '@/lib/schemas/passkey';

/** The passkeys of whoever is signed in, and why there can be none here. */
export async function showPasskeys({ db, signedIn }: Visit & { signedIn: SignedIn }): Promise<PasskeyList> {
  const place = passkeyPlace(environment().origin);
  const passkeys = await listPasskeys(db, signedIn.personId);
  return {
    passkeys: passkeys.map(({ id, name, createdAt, lastUsedAt }) => ({
      id,
      name,
      createdAt: createdAt.toISOString(),
      lastUsedAt: lastUsedAt?.toISOString() ?? null,
    })),
    obstacle: 'obstacle' in place ? place.obstacle : null,
  };
}
