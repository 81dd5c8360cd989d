import 'server-only';
import { listVisits } from '@/db/queries/visits';
import { assertMay } from '@/lib/auth/permissions';
import { type Visits, VISITS_SHOWN } from '@/lib/schemas/visit';
import type { ServiceContext } from './context';
import { shownName } from './shown-name';

/** The newest visits of a professional. */
export async function showVisits({ db, access }: ServiceContext): Promise<Visits> {
  assertMay(access, 'look');
  const visits = await listVisits(db, access.householdId, VISITS_SHOWN);
  return visits.map((visit) => ({ ...visit, recordedBy: shownName(visit.recordedBy, access.language) }));
}
