import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { listValidMemberships } from '@/db/queries/memberships';
import type { SignedIn } from '@/lib/auth/sessions';
import type { HouseholdList } from '@/lib/schemas/household';

type PersonContext = { db: DatabaseOrTransaction; now: Date; signedIn: SignedIn };

/** The households a person may enter now; the current one is the one this device looks at. */
export async function listHouseholds({ db, now, signedIn }: PersonContext): Promise<HouseholdList> {
  const memberships = await listValidMemberships(db, signedIn.personId, now);
  const current = signedIn.householdId ?? memberships[0]?.household.id;
  return memberships.map(({ role, poolCompletedAt, household: { id, name, timeZone, unitSystem, locale, demo } }) => ({
    id,
    name,
    role,
    timeZone,
    unitSystem,
    locale,
    demo,
    current: id === current,
    poolCompleted: poolCompletedAt !== null,
  }));
}
