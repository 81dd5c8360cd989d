import 'server-only';
import type { Visit } from '@/lib/auth/visit';
import type { Done } from '@/lib/schemas/account';

/** Signs out on this device; without a session it only makes sure that the cookie is gone. */
export async function signOut(visit: Visit): Promise<Done> {
  await visit.leave();
  return { done: true };
}
