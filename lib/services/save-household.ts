import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { updateHousehold } from '@/db/queries/households';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import type { Done } from '@/lib/schemas/account';
import type { HouseholdChanges } from '@/lib/schemas/household';
import type { ServiceContext } from './context';

/** Changes the household's name, time zone, units or language; what is left out stays. */
export async function saveHousehold({ db, access, now }: ServiceContext, changes: HouseholdChanges): Promise<Done> {
  assertMay(access, 'change-household');
  const { householdId, personId } = access;
  const given = Object.fromEntries(Object.entries(changes).filter(([, value]) => value !== undefined));
  await inWriteTransaction(db, async (tx) => {
    await updateHousehold(tx, householdId, given);
    await writeAudit(tx, { householdId, personId, at: now, action: 'save-household', detail: given });
  });
  return { done: true };
}
