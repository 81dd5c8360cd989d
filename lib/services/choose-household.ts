import 'server-only';
import type { Database } from '@/db/client';
import { chooseSessionHousehold } from '@/db/queries/sessions';
import { proveHousehold } from '@/lib/auth/household-access';
import type { SignedIn } from '@/lib/auth/sessions';
import type { HouseholdList } from '@/lib/schemas/household';
import { listHouseholds } from './list-households';

type PersonContext = { db: Database; now: Date; signedIn: SignedIn };

/** Makes this device look at another household of the person. Error: `not-allowed` when it is none of theirs. */
export async function chooseHousehold(
  { db, now, signedIn }: PersonContext,
  { householdId }: { householdId: string },
): Promise<HouseholdList> {
  const access = await proveHousehold(db, { personId: signedIn.personId, householdId, now });
  await chooseSessionHousehold(db, signedIn.sessionId, access.householdId);
  return listHouseholds({ db, now, signedIn: { ...signedIn, householdId } });
}
