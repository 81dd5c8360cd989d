import 'server-only';
import { deleteHousehold } from '@/db/queries/households';
import { listMembers } from '@/db/queries/memberships';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { systemScope } from '@/lib/auth/system-scope';
import type { HouseholdRequest } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Done } from '@/lib/schemas/account';
import type { Closing } from '@/lib/schemas/household';
import { confirmPassword } from './confirm-password';

/** Years of a household, photos included, go in one transaction [ms]. */
const LONGEST_DELETION = 20_000;

/** Deletes a household for everybody, with everything in it. Nothing of it can be fetched back. */
export async function closeHousehold(
  { visit, db, access, now }: HouseholdRequest,
  { password, name }: Closing,
): Promise<Done> {
  assertMay(access, 'close-household');
  if (access.demo) throw new AppError('not-allowed', 'The demo household is not closed: it is gone after a day.');
  const { householdId, householdName, personId } = access;
  if (spelled(name) !== spelled(householdName)) {
    const message = `The household is called ${householdName}. Write its name to close it.`;
    throw new AppError('invalid-input', message, { problems: [{ path: 'name', message }] });
  }
  await confirmPassword(visit, { personId, password, path: 'password' });
  await inWriteTransaction(
    db,
    async (tx) => {
      const members = await listMembers(tx, householdId, now);
      // Looked at inside: another owner may have taken the role away meanwhile.
      if (!members.some((member) => member.personId === personId && member.role === 'owner'))
        throw new AppError('not-allowed', 'Only an owner can close this household.');
      await deleteHousehold(tx, systemScope('leaving'), householdId);
    },
    LONGEST_DELETION,
  );
  return { done: true };
}

/** Capitals and spaces are no reason to doubt what somebody means. */
function spelled(name: string): string {
  return name.normalize('NFKC').trim().replace(/\s+/g, ' ').toLowerCase();
}
