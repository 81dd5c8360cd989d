import 'server-only';
import type { Visit } from '@/lib/auth/visit';
import type { SignedInDevice } from '@/lib/schemas/device';

/** Where whoever asks is signed in: this device first, then the one that was used last. */
export async function showDevices(visit: Visit): Promise<SignedInDevice[]> {
  const sessions = await visit.devices();
  const isThis = ({ sessionId }: { sessionId: string }) => sessionId === visit.signedIn?.sessionId;
  return sessions
    .sort((one, other) => (other.lastSeenAt?.getTime() ?? 0) - (one.lastSeenAt?.getTime() ?? 0))
    .sort((one, other) => (isThis(one) ? -1 : isThis(other) ? 1 : 0))
    .map((session) => ({
      id: session.publicId,
      device: session.device,
      current: isThis(session),
      startedAt: session.startedAt?.toISOString() ?? null,
      lastSeenAt: session.lastSeenAt?.toISOString() ?? null,
    }));
}
