import 'server-only';
import type { Transaction } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { insertInvitation, listOpenInvitations, renewInvitation, withdrawInvitation } from '@/db/queries/invitations';
import { withdrawMails } from '@/db/queries/outgoing-mails';
import { inWriteTransaction } from '@/db/write';
import { linkDigest, linkTo, newLinkToken } from '@/lib/auth/link-token';
import { assertMay } from '@/lib/auth/permissions';
import { countTry } from '@/lib/auth/rate-limit';
import type { HouseholdRequest } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import type { HouseholdPeople, NewInvitation, SentInvitation } from '@/lib/schemas/member';
import type { ServiceContext } from './context';
import { deliverSoon } from './deliver-mail';
import { mailInvitation } from './mail-invitation';
import { showPeople } from './show-people';

const OPEN_FOR = 7 * 24 * 3_600_000;
/** A family is no more; a list of strangers would be. */
const MOST_OPEN = 20;

/** Asks somebody to join, so often a day and no more. Error: `too-many-requests`. */
export async function sendInvitation(context: HouseholdRequest, invitation: NewInvitation): Promise<SentInvitation> {
  await countTry(context.visit, 'invite-person', context.access.personId);
  return invite(context, invitation);
}

/** Another link, counted like the first. Error: `too-many-requests`. */
export async function sendInvitationAgain(context: HouseholdRequest, which: { id: string }): Promise<SentInvitation> {
  await countTry(context.visit, 'invite-person', context.access.personId);
  return inviteAgain(context, which);
}

/**
 * Asks somebody to join. Sent by mail, the link is known to whoever reads that mail alone; else it is told this once: of it
 * only a digest is kept.
 */
export async function invite(context: ServiceContext, invitation: NewInvitation): Promise<SentInvitation> {
  const { access, now } = context;
  assertMay(access, 'invite');
  refuseDemo(access.demo);
  const { householdId, personId } = access;
  const { id, name, email = null, role, chemicalsAllowed } = invitation;
  return withLink(context, email, async (tx, token) => {
    if ((await listOpenInvitations(tx, householdId)).length >= MOST_OPEN)
      throw new AppError('conflict', 'So many invitations are open already. Withdraw one first.');
    const row = { id, householdId, name, email, role, chemicalsAllowed, createdBy: personId, ...linkOf(token, now) };
    if (!(await insertInvitation(tx, row)))
      throw new AppError('conflict', 'This invitation was sent already. Send it again to get another link.');
    const detail = { name, role, chemicalsAllowed };
    await writeAudit(tx, { householdId, personId, at: now, action: 'invite', subjectId: id, detail });
    if (email !== null) await mailInvitation(tx, context, { id, name, email, role, ...linkOf(token, now), token });
  });
}

/** Another link for seven more days, by the way of the one before it, which no longer opens. */
export async function inviteAgain(context: ServiceContext, { id }: { id: string }): Promise<SentInvitation> {
  const { db, access, now } = context;
  assertMay(access, 'invite');
  const { householdId, personId } = access;
  const [asked] = (await listOpenInvitations(db, householdId)).filter((invitation) => invitation.id === id);
  return withLink(context, asked?.email ?? null, async (tx, token) => {
    const renewed = await renewInvitation(tx, { householdId, id, ...linkOf(token, now) });
    if (!renewed) throw notOpen();
    await writeAudit(tx, { householdId, personId, at: now, action: 'invite-again', subjectId: id });
    await withdrawMails(tx, id);
    const { email } = renewed;
    if (email !== null) await mailInvitation(tx, context, { id, ...renewed, email, ...linkOf(token, now), token });
  });
}

/** Takes an invitation back. */
export async function uninvite(context: ServiceContext, { id }: { id: string }): Promise<HouseholdPeople> {
  const { db, access, now } = context;
  assertMay(access, 'invite');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    if (!(await withdrawInvitation(tx, { householdId, id, at: now }))) throw notOpen();
    await withdrawMails(tx, id);
    await writeAudit(tx, { householdId, personId, at: now, action: 'uninvite', subjectId: id });
  });
  return showPeople(context);
}

async function withLink(
  context: ServiceContext,
  email: string | null,
  work: (tx: Transaction, token: string) => Promise<void>,
): Promise<SentInvitation> {
  const token = newLinkToken();
  await inWriteTransaction(context.db, (tx) => work(tx, token));
  if (email !== null) deliverSoon(context.db);
  return { ...(await showPeople(context)), link: email === null ? linkTo('invitation', token) : null };
}

function linkOf(token: string, now: Date) {
  const tokenDigest = linkDigest('invitation', token);
  return { tokenDigest, createdAt: now, expiresAt: new Date(now.getTime() + OPEN_FOR) };
}

function refuseDemo(demo: boolean): void {
  if (demo) throw new AppError('not-allowed', 'Nobody can be invited into the demo household.');
}

function notOpen(): AppError {
  return new AppError('not-found', 'This invitation is used, withdrawn, or not of this household.');
}
