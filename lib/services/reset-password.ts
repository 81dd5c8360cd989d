import 'server-only';
import type { Database } from '@/db/client';
import { consumeAccountLink, endAccountLinks, insertAccountLink } from '@/db/queries/account-links';
import { deletePasskeysOf } from '@/db/queries/passkeys';
import {
  findAccount,
  findPersonByEmail,
  findUnprovenByEmail,
  setEmailConfirmed,
  setPasswordHash,
} from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { linkDigest, linkTo, newLinkToken } from '@/lib/auth/link-token';
import { hashPassword, isCommonPassword } from '@/lib/auth/passwords';
import { countTry, forgetTries } from '@/lib/auth/rate-limit';
import { systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { AppError } from '@/lib/errors';
import { logFault } from '@/lib/log';
import type { Done, PasswordReset, ResetRequest } from '@/lib/schemas/account';
import type { OpenedAccountLink } from '@/lib/schemas/account-link';
import { openLink } from './confirm-email';
import { deliverSoon } from './deliver-mail';
import { queueMail, sendsMail } from './queue-mail';

const OPEN_FOR = 3_600_000;

/**
 * Somebody has forgotten their password. The answer is the same, and as quick, whether the address is known or not: the
 * work is done behind it.
 */
export async function requestReset(visit: Visit, { email }: ResetRequest): Promise<Done> {
  if (!sendsMail())
    throw new AppError('not-allowed', 'This server sends no mail. Ask whoever runs it for another password.');
  await countTry(visit, 'reset-address', visit.address);
  await countTry(visit, 'reset-email', email);
  sendResetLink(visit, email).catch((error: unknown) => logFault(error, { task: 'reset-password' }));
  return { done: true };
}

/** The mail goes to the address of the account, not to what was typed: the two could differ in what only looks alike. */
export async function sendResetLink({ db, now }: { db: Database; now: Date }, typed: string): Promise<void> {
  const scope = systemScope('mail');
  const person = (await findPersonByEmail(db, scope, typed)) ?? (await findUnprovenByEmail(db, scope, typed));
  if (!person?.email) return;
  const { id: personId, name, email, language } = person;
  const token = newLinkToken();
  await inWriteTransaction(db, async (tx) => {
    const times = { createdAt: now, expiresAt: new Date(now.getTime() + OPEN_FOR) };
    const tokenDigest = linkDigest('reset', token);
    await insertAccountLink(tx, { tokenDigest, personId, purpose: 'reset-password', email, ...times });
    const letter = { about: 'reset', name, link: linkTo('reset', token) } as const;
    await queueMail(tx, { letter, email, language, now, about: { personId } });
  });
  deliverSoon(db);
}

/** What a link to another password leads to, for whoever holds it. */
export function openReset(visit: Visit, token: string): Promise<OpenedAccountLink> {
  return openLink(visit, linkDigest('reset', token));
}

/** Another password, for whoever reads the mail of the account; every device is signed out by it. */
export async function resetPassword(visit: Visit, { token, password }: PasswordReset): Promise<Done> {
  await countTry(visit, 'reset-address', visit.address);
  if (isCommonPassword(password)) {
    const message = 'This password is one of those that are tried first. Choose another.';
    throw new AppError('invalid-input', message, { problems: [{ path: 'password', message }] });
  }
  const { db, now } = visit;
  const passwordHash = await hashPassword(password);
  const { personId, email } = await inWriteTransaction(db, async (tx) => {
    const link = await consumeAccountLink(tx, systemScope('mail'), {
      tokenDigest: linkDigest('reset', token),
      at: now,
    });
    if (!link) throw new AppError('conflict', 'This link is used, over or not known. Ask for another mail.');
    await setPasswordHash(tx, link.personId, passwordHash);
    // Somebody else may have made this account with an address that is not theirs: no passkey of it lets them in again.
    if ((await findAccount(tx, link.personId))?.proven === false) await deletePasskeysOf(tx, link.personId);
    await setEmailConfirmed(tx, { personId: link.personId, email: link.email, at: now });
    // Whoever took the account over may have asked for another address already.
    await endAccountLinks(tx, link.personId, ['change-email', 'reset-password']);
    const account = await findAccount(tx, link.personId);
    if (account?.email) {
      const { name, language } = account;
      const letter = { about: 'password', name } as const;
      await queueMail(tx, { letter, email: account.email, language, now, about: { personId: link.personId } });
    }
    return link;
  });
  await visit.leaveAll(personId);
  await forgetTries(visit, 'sign-in-email', email);
  deliverSoon(db);
  return { done: true };
}
