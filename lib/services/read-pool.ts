import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { findPool } from '@/db/queries/pools';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { AppError } from '@/lib/errors';
import type { SetupState } from '@/lib/schemas/pool-profile';
import { scopeOf } from '@/lib/schemas/pool-scope';
import { profileOf } from './pool-profile';
import { shownName } from './shown-name';

/** Everything answered about the pool, where the first run stands, and whether Wadewell is for this pool. */
export async function readPool({
  db,
  access,
}: {
  db: DatabaseOrTransaction;
  access: Pick<HouseholdAccess, 'householdId' | 'handlesChemicals' | 'timeZone' | 'language'>;
}): Promise<SetupState> {
  const found = await findPool(db, access.householdId);
  if (!found) throw new AppError('not-found', 'This household has no pool.');
  const { pool, swimLimitSetBy } = found;
  const profile = profileOf(pool, access, shownName(swimLimitSetBy, access.language));
  return {
    nextStep: pool.nextStep,
    completed: pool.completedAt !== null,
    recordOnly: pool.recordOnly,
    decision: scopeOf(profile.scope, profile.volume),
    profile,
  };
}
