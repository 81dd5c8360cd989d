import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { insertInvitation, listOpenInvitations, renewInvitation, withdrawInvitation } from '@/db/queries/invitations';
import { inWriteTransaction } from '@/db/write';
import { invitationDigest, invitationLink, newInvitationToken } from '@/lib/auth/invitation-token';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { HouseholdPeople, NewInvitation, SentInvitation } from '@/lib/schemas/member';
import type { ServiceContext } from './context';
import { showPeople } from './show-people';

const OPEN_FOR = 7 * 24 * 3_600_000;
/** A family is no more; a list of strangers would be. */
const MOST_OPEN = 20;

/** Asks somebody to join. The link is told this once: of it only a digest is kept. */
export async function invite(context: ServiceContext, invitation: NewInvitation): Promise<SentInvitation> {
  const { db, access, now } = context;
  assertMay(access, 'invite');
  refuseDemo(access.demo);
  const { householdId, personId } = access;
  const { id, name, role, chemicalsAllowed } = invitation;
  const token = newInvitationToken();
  await inWriteTransaction(db, async (tx) => {
    if ((await listOpenInvitations(tx, householdId)).length >= MOST_OPEN)
      throw new AppError('conflict', 'So many invitations are open already. Withdraw one first.');
    const row = { id, householdId, name, role, chemicalsAllowed, createdBy: personId, ...linkOf(token, now) };
    if (!(await insertInvitation(tx, row)))
      throw new AppError('conflict', 'This invitation was sent already. Send it again to get another link.');
    const detail = { name, role, chemicalsAllowed };
    await writeAudit(tx, { householdId, personId, at: now, action: 'invite', subjectId: id, detail });
  });
  return { ...(await showPeople(context)), link: invitationLink(token) };
}

/** Another link for seven more days; the one before it no longer opens. */
export async function inviteAgain(context: ServiceContext, { id }: { id: string }): Promise<SentInvitation> {
  const { db, access, now } = context;
  assertMay(access, 'invite');
  const { householdId, personId } = access;
  const token = newInvitationToken();
  await inWriteTransaction(db, async (tx) => {
    if (!(await renewInvitation(tx, { householdId, id, ...linkOf(token, now) }))) throw notOpen();
    await writeAudit(tx, { householdId, personId, at: now, action: 'invite-again', subjectId: id });
  });
  return { ...(await showPeople(context)), link: invitationLink(token) };
}

/** Takes an invitation back. */
export async function uninvite(context: ServiceContext, { id }: { id: string }): Promise<HouseholdPeople> {
  const { db, access, now } = context;
  assertMay(access, 'invite');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    if (!(await withdrawInvitation(tx, { householdId, id, at: now }))) throw notOpen();
    await writeAudit(tx, { householdId, personId, at: now, action: 'uninvite', subjectId: id });
  });
  return showPeople(context);
}

function linkOf(token: string, now: Date) {
  return { tokenDigest: invitationDigest(token), createdAt: now, expiresAt: new Date(now.getTime() + OPEN_FOR) };
}

function refuseDemo(demo: boolean): void {
  if (demo) throw new AppError('not-allowed', 'Nobody can be invited into the demo household.');
}

function notOpen(): AppError {
  return new AppError('not-found', 'This invitation is used, withdrawn, or not of this household.');
}
