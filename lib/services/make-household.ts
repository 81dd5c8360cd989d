import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from '@/db/client';
import { insertHousehold } from '@/db/queries/households';
import { insertMembership } from '@/db/queries/memberships';
import { findPasswordHash } from '@/db/queries/people';
import { chooseSessionHousehold } from '@/db/queries/sessions';
import { inWriteTransaction } from '@/db/write';
import { countTry } from '@/lib/auth/rate-limit';
import type { SignedIn } from '@/lib/auth/sessions';
import { householdOfSystem, systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Entered } from '@/lib/schemas/account';
import type { NewHousehold } from '@/lib/schemas/household';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

/** Makes a household of one's own, for somebody who has an account already, and looks at it from now on. */
export async function makeHousehold(visit: Visit & { signedIn: SignedIn }, household: NewHousehold): Promise<Entered> {
  const { db, now, signedIn } = visit;
  const { personId, sessionId } = signedIn;
  await countTry(visit, 'new-household-person', personId);
  const householdId = await inWriteTransaction(db, async (tx) => {
    if ((await findPasswordHash(tx, personId)) === null)
      throw new AppError('not-allowed', 'A look round has no account. Sign out, then start a sheet of your own.');
    return addHousehold(tx, household, { owner: personId, now });
  });
  await chooseSessionHousehold(db, sessionId, householdId);
  return { next: '/first-run' };
}

/** Writes a household with its first owner. */
export async function addHousehold(
  tx: Transaction,
  household: NewHousehold,
  { owner, now }: { owner: string; now: Date },
): Promise<ProvenHouseholdId> {
  const scope = systemScope('sign-up');
  const id = householdOfSystem(scope, randomUUID());
  await insertHousehold(tx, scope, { ...household, id, createdAt: now });
  const membership = { id: randomUUID(), householdId: id, personId: owner, role: 'owner', validFrom: now } as const;
  await insertMembership(tx, scope, membership);
  return id;
}
