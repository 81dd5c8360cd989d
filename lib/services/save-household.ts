import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { updateHousehold } from '@/db/queries/households';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import type { Done } from '@/lib/schemas/account';
import type { HouseholdChanges } from '@/lib/schemas/household';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import type { ServiceContext } from './context';

/** Changes the household's name, time zone, units or language; what is left out stays. */
export async function saveHousehold(context: ServiceContext, changes: HouseholdChanges): Promise<Done> {
  const { db, access, now } = context;
  assertMay(access, 'change-household');
  const { householdId, personId } = access;
  const given = Object.fromEntries(Object.entries(changes).filter(([, value]) => value !== undefined));
  if (Object.keys(given).length === 0) return { done: true };
  await inWriteTransaction(db, async (tx) => {
    await updateHousehold(tx, householdId, given);
    await writeAudit(tx, { householdId, personId, at: now, action: 'save-household', detail: given });
  });
  // The days of the plan, its evenings and its swim hours move with the zone.
  const { timeZone } = changes;
  if (timeZone !== undefined) await bringPlanUpToDate({ db, access: { ...access, timeZone }, now });
  return { done: true };
}
