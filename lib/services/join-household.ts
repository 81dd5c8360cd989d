import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Database, Transaction } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { consumeInvitation, findInvitation } from '@/db/queries/invitations';
import { insertMembership, listValidMemberships } from '@/db/queries/memberships';
import { findPasswordHash } from '@/db/queries/people';
import { chooseSessionHousehold } from '@/db/queries/sessions';
import { inWriteTransaction } from '@/db/write';
import { linkDigest } from '@/lib/auth/link-token';
import { countTry, mayTry } from '@/lib/auth/rate-limit';
import type { SignedIn } from '@/lib/auth/sessions';
import { householdOfSystem, systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { Entered } from '@/lib/schemas/account';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import type { OpenedInvitation } from '@/lib/schemas/member';

type PersonContext = { db: Database; now: Date; signedIn: SignedIn };

/** What the link of an invitation leads to, for a page; an address that opens many is told so. */
export async function seeInvitation(visit: Visit, token: string): Promise<OpenedInvitation> {
  return (await mayTry(visit, 'invitation-address', visit.address))
    ? openInvitation(visit, token)
    : { state: 'too-often' };
}

/** What the link of an invitation leads to, for whoever holds it. */
export async function openInvitation({ db, now }: Visit, token: string): Promise<OpenedInvitation> {
  const found = await findInvitation(db, systemScope('invitation'), linkDigest('invitation', token));
  if (!found) return { state: 'unknown' };
  if (found.usedAt) return { state: 'used' };
  if (found.withdrawnAt) return { state: 'withdrawn' };
  if (found.expiresAt.getTime() <= now.getTime()) return { state: 'expired' };
  const { householdName, invitedBy, name, role } = found;
  return { state: 'open', householdName, invitedBy, name, role };
}

/** Joins the household of an invitation by a session of its own: what may be done on this device has changed. */
export async function acceptInvitation(
  visit: Visit & { signedIn: SignedIn },
  { token }: { token: string },
): Promise<Entered> {
  await countTry(visit, 'invitation-address', visit.address);
  const joined = await joinHousehold(visit, { token });
  await visit.renew();
  return joined;
}

/** Joins the household of an invitation, and looks at it from now on. */
export async function joinHousehold(
  { db, now, signedIn }: PersonContext,
  { token }: { token: string },
): Promise<Entered> {
  const { personId, sessionId } = signedIn;
  const householdId = await inWriteTransaction(db, async (tx) => {
    // A visitor of the demo is gone after a day, with everything that was theirs; a deleted account is gone now.
    if ((await findPasswordHash(tx, personId)) === null)
      throw new AppError('not-allowed', 'A look round has no account. Sign out, then open the link again.');
    return useInvitation(tx, { token, personId, now });
  });
  await chooseSessionHousehold(db, sessionId, householdId);
  return { next: '/week' };
}

/** Uses an invitation up for a person. Errors: `conflict` for one that is over, and for who belongs there already. */
export async function useInvitation(
  tx: Transaction,
  { token, personId, now }: { token: string; personId: string; now: Date },
): Promise<ProvenHouseholdId> {
  const scope = systemScope('invitation');
  const found = await findInvitation(tx, scope, linkDigest('invitation', token));
  if (!found) throw new AppError('not-found', 'This invitation is not known. Ask for another link.');
  const { householdId, role, chemicalsAllowed } = found;
  const belongs = await listValidMemberships(tx, personId, now);
  if (belongs.some(({ household }) => household.id === householdId))
    throw new AppError('conflict', 'You belong to this household already.');
  if (!(await consumeInvitation(tx, scope, { id: found.id, personId, at: now })))
    throw new AppError('conflict', 'This invitation is used, withdrawn or over. Ask for another link.');
  const membershipId = randomUUID();
  const membership = { id: membershipId, householdId, personId, role, chemicalsAllowed, validFrom: now };
  await insertMembership(tx, scope, membership);
  const entry = { personId, at: now, action: 'join' as const, subjectId: membershipId, detail: { role } };
  const joined = householdOfSystem(scope, householdId);
  await writeAudit(tx, { householdId: joined, ...entry });
  return joined;
}
