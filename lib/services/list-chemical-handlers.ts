import 'server-only';
import { listMarkedHandlers } from '@/db/queries/memberships';
import { findHandOverInForce } from '@/lib/auth/hand-over-in-force';
import { safetyCardCounts } from '@/lib/auth/household-access';
import type { ServiceContext } from './context';

/** Who may dose at this instant: marked members, and who stands in with an owner's word for it; all with the card read. */
export async function listChemicalHandlers({
  db,
  access: { householdId, timeZone },
  now,
}: ServiceContext): Promise<{ membershipId: string; name: string }[]> {
  const marked = await listMarkedHandlers(db, householdId, now);
  const handOver = await findHandOverInForce(db, { householdId, timeZone, now });
  const standsIn =
    handOver?.chemicalsAllowed && !marked.some(({ membershipId }) => membershipId === handOver.membershipId)
      ? [handOver]
      : [];
  return [...marked, ...standsIn]
    .filter(({ safetyCardReadAt }) => safetyCardCounts(safetyCardReadAt, now))
    .map(({ membershipId, name }) => ({ membershipId, name }));
}
