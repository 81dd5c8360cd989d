import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { endBelonging, letPersonGo } from '@/db/queries/former-members';
import { deleteHousehold } from '@/db/queries/households';
import { listMembers, listValidMemberships } from '@/db/queries/memberships';
import { findPasswordHash } from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { householdOfSystem, systemScope } from '@/lib/auth/system-scope';
import type { SignedIn } from '@/lib/auth/sessions';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { AccountDeletion, DeletionPreview, Done } from '@/lib/schemas/account';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import { confirmPassword } from './confirm-password';

type PersonVisit = Visit & { signedIn: SignedIn };
type Fate = DeletionPreview['households'][number] & { id: ProvenHouseholdId; membershipId: string };

/** Years of a household, photos included, go in one transaction [ms]. */
const LONGEST_DELETION = 20_000;

/** What deleting the account would do to each household of the person. */
export async function showDeletion({ db, now, signedIn }: PersonVisit): Promise<DeletionPreview> {
  await refuseDemo(db, signedIn);
  return { households: await fatesOf(db, signedIn.personId, now) };
}

/**
 * Deletes an account, all of it or nothing: households of which nobody else is a member go with everything in them, the
 * others keep what was entered, under somebody who is not named any more.
 */
export async function deleteAccount(visit: PersonVisit, { password, deletes }: AccountDeletion): Promise<Done> {
  const { db, now } = visit;
  const { personId } = visit.signedIn;
  await refuseDemo(db, visit.signedIn);
  const hash = await confirmPassword(visit, { personId, password, path: 'password' });
  const scope = systemScope('leaving');
  await inWriteTransaction(
    db,
    async (tx) => {
      // Looked at inside: meanwhile another device may have deleted the account, or changed the password.
      if ((await findPasswordHash(tx, personId)) !== hash)
        throw new AppError('signed-out', 'You are signed out. Sign in, then try again.');
      for (const { id, name, fate, membershipId } of await fatesOf(tx, personId, now)) {
        if (fate === 'blocked')
          throw new AppError(
            'conflict',
            `You are the last owner of ${name}, and others belong to it. Make somebody an owner first, or close it.`,
          );
        if (fate === 'left') {
          const entry = { personId, at: now, action: 'leave', subjectId: membershipId } as const;
          await writeAudit(tx, { householdId: id, ...entry });
        } else if (deletes.includes(id)) await deleteHousehold(tx, scope, id);
        else
          throw new AppError(
            'conflict',
            `By now nobody else belongs to ${name}: it would be deleted with everything in it. Look again first.`,
          );
      }
      await endBelonging(tx, scope, { personId, at: now });
      await letPersonGo(tx, scope, { personId, at: now });
    },
    LONGEST_DELETION,
  );
  await visit.leave();
  return { done: true };
}

async function fatesOf(db: DatabaseOrTransaction, personId: string, now: Date): Promise<Fate[]> {
  const fates: Fate[] = [];
  for (const { household, membershipId } of await listValidMemberships(db, personId, now)) {
    const id = householdOfSystem(systemScope('leaving'), household.id);
    const others = (await listMembers(db, id, now)).filter((member) => member.personId !== personId);
    const fate = others.length === 0 ? 'deleted' : others.some(({ role }) => role === 'owner') ? 'left' : 'blocked';
    fates.push({ id, name: household.name, fate, others: others.length, membershipId });
  }
  return fates;
}

async function refuseDemo(db: DatabaseOrTransaction, { personId }: SignedIn): Promise<void> {
  if ((await findPasswordHash(db, personId)) === null)
    throw new AppError('not-allowed', 'A look round has no account to delete. Sign out, and it is gone after a day.');
}
