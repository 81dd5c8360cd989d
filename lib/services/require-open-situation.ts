import 'server-only';
import type { Transaction } from '@/db/client';
import { findSituation, type StoredSituation } from '@/db/queries/situations';
import { AppError } from '@/lib/errors';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

/** An open procedure of the household. Errors: `not-found` for a foreign one, `conflict` for one that is over. */
export async function requireOpenSituation(
  tx: Transaction,
  { householdId, id }: { householdId: ProvenHouseholdId; id: string },
): Promise<StoredSituation> {
  const found = await findSituation(tx, { householdId, id });
  if (!found) throw new AppError('not-found', 'There is no such situation here.');
  if (found.endedAt) throw new AppError('conflict', 'This situation is over. Somebody ended it.');
  return found;
}
