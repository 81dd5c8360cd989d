import 'server-only';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { SignedInDevice } from '@/lib/schemas/device';
import { showDevices } from './show-devices';

/** Signs out on one device. Error: `not-found` for one that is somebody else's, as for one that there is not. */
export async function signOutDevice(visit: Visit, { id }: { id: string }): Promise<SignedInDevice[]> {
  const sessions = await visit.devices();
  const session = sessions.find(({ publicId }) => publicId === id);
  if (!session) throw new AppError('not-found', 'You are not signed in on this device, or no longer.');
  await visit.leaveOn(session);
  return showDevices(visit);
}
