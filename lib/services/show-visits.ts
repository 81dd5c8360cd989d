import 'server-only';
import { listVisits } from '@/db/queries/visits';
import { assertMay } from '@/lib/auth/permissions';
import { type Visits, VISITS_SHOWN } from '@/lib/schemas/visit';
import type { ServiceContext } from './context';

/** The newest visits of a professional. */
export async function showVisits({ db, access }: ServiceContext): Promise<Visits> {
  assertMay(access, 'look');
  return listVisits(db, access.householdId, VISITS_SHOWN);
}
