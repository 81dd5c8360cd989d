import 'server-only';
import { listValidMemberships } from '@/db/queries/memberships';
import type { Visit } from '@/lib/auth/visit';
import type { Role } from '@/lib/schemas/week-sheet';

type DeviceOwner = { personId: string; households: { id: string; role: Role }[] };

/** Whom a device belongs to now, for the device itself, which forgets what was kept for somebody else; null for nobody. */
export async function showDeviceOwner({ db, now, signedIn }: Visit): Promise<DeviceOwner | null> {
  if (!signedIn) return null;
  const memberships = await listValidMemberships(db, signedIn.personId, now);
  return {
    personId: signedIn.personId,
    households: memberships.map(({ role, household: { id } }) => ({ id, role })),
  };
}
