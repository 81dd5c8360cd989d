import type { Role } from '@/lib/schemas/week-sheet';
import { forgetDevice } from './forget-device';

/** Who uses this device, and what they are in each of their households; null for nobody. */
export type DeviceOwner = { personId: string; households: readonly { id: string; role: Role }[] } | null;

const name = 'wadewell-owner';
const ranks: Record<Role, number> = { viewer: 0, caretaker: 1, owner: 2 };

/**
 * Compares who uses this device now with who did: when it is somebody else, or a household or a role is gone, what was kept
 * for it is forgotten. What somebody could not send is forgotten with it only when it is somebody else, or they belong nowhere
 * any more: a dose that was given and is lost here would be given twice.
 */
export async function settleDevice(now: DeviceOwner): Promise<void> {
  const before = keptOwner();
  if (before !== null && hasLost(before, now)) await forgetDevice({ keepUnsent: mayStillSend(before, now) });
  // After somebody was signed out their name is kept as long as something of theirs waits.
  if (now !== null || before === null) keepOwner(now);
  else keepOwner(before);
}

function mayStillSend(before: NonNullable<DeviceOwner>, now: DeviceOwner): boolean {
  return now === null || (now.personId === before.personId && now.households.length > 0);
}

function hasLost(before: NonNullable<DeviceOwner>, now: DeviceOwner): boolean {
  if (now?.personId !== before.personId) return true;
  return before.households.some(({ id, role }) => {
    const still = now.households.find((household) => household.id === id);
    return still === undefined || ranks[still.role] < ranks[role];
  });
}

function keepOwner(owner: DeviceOwner): void {
  try {
    if (owner === null) window.localStorage.removeItem(name);
    else window.localStorage.setItem(name, JSON.stringify(owner));
  } catch {
    // A window that keeps nothing has nothing to forget.
  }
}

/** By hand, because it is read on every page, and zod is on none at first. */
function keptOwner(): DeviceOwner {
  try {
    const kept: unknown = JSON.parse(window.localStorage.getItem(name) ?? 'null');
    return isOwner(kept) ? kept : null;
  } catch {
    return null;
  }
}

function isOwner(kept: unknown): kept is NonNullable<DeviceOwner> {
  if (typeof kept !== 'object' || kept === null) return false;
  const { personId, households } = kept as Record<string, unknown>;
  return typeof personId === 'string' && Array.isArray(households) && households.every(isPlace);
}

function isPlace(place: unknown): boolean {
  if (typeof place !== 'object' || place === null) return false;
  const { id, role } = place as Record<string, unknown>;
  return typeof id === 'string' && typeof role === 'string' && Object.hasOwn(ranks, role);
}
