import 'server-only';
import type { Transaction } from '@/db/client';
import { consumeAccountLink, findAccountLink, insertAccountLink } from '@/db/queries/account-links';
import { findAccount, findPersonByEmail, setEmail, setEmailConfirmed } from '@/db/queries/people';
import { inWriteTransaction } from '@/db/write';
import { linkDigest, linkTo, newLinkToken } from '@/lib/auth/link-token';
import { countTry, mayTry } from '@/lib/auth/rate-limit';
import type { SignedIn } from '@/lib/auth/sessions';
import { systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { environment } from '@/lib/env';
import { AppError } from '@/lib/errors';
import type { Done } from '@/lib/schemas/account';
import type { OpenedAccountLink } from '@/lib/schemas/account-link';
import type { Language } from '@/lib/schemas/languages';
import { deliverSoon } from './deliver-mail';
import { queueMail, sendsMail } from './queue-mail';

const hour = 3_600_000;
const OPEN_FOR = { 'confirm-email': 72 * hour, 'change-email': 24 * hour };

type Addressee = { personId: string; name: string; email: string; language: Language };

/**
 * Asks whether an address is whose it should be: a link goes there, and nothing changes before it was opened. A mute one
 * looks the same to whoever asked, and nothing is sent. Whoever has the address already is told so instead.
 */
export async function askForConfirmation(
  tx: Transaction,
  { personId, name, email, language }: Addressee,
  { purpose, now, mute = false }: { purpose: 'confirm-email' | 'change-email'; now: Date; mute?: boolean },
): Promise<void> {
  if (!sendsMail()) return;
  const token = newLinkToken();
  const expiresAt = new Date(now.getTime() + OPEN_FOR[purpose]);
  const tokenDigest = linkDigest('confirm', token);
  await insertAccountLink(tx, { tokenDigest, personId, purpose, email, createdAt: now, expiresAt });
  if (mute) return;
  const holder = purpose === 'confirm-email' ? await findPersonByEmail(tx, systemScope('mail'), email) : null;
  if (holder && holder.id !== personId) {
    // In the name of the holder's account: what somebody else calls themselves has no business in this mail.
    const letter = { about: 'taken', name: holder.name, link: `${environment().origin}/sign-in` } as const;
    await queueMail(tx, { letter, email, language: holder.language, now, about: { personId } });
    return;
  }
  const about = purpose === 'confirm-email' ? 'confirm' : 'change';
  const letter = { about, name, link: linkTo('confirm', token) } as const;
  await queueMail(tx, { letter, email, language, now, about: { personId } });
}

/** Another mail with another link, for somebody whose first one did not arrive. */
export async function askAgain({ db, now, keyOf, signedIn }: Visit & { signedIn: SignedIn }): Promise<Done> {
  const { personId } = signedIn;
  await countTry({ db, now, keyOf }, 'mail-person', personId);
  await inWriteTransaction(db, async (tx) => {
    const account = await findAccount(tx, personId);
    if (!account?.email || account.emailConfirmedAt) return;
    const { name, email, language } = account;
    await askForConfirmation(tx, { personId, name, email, language }, { purpose: 'confirm-email', now });
  });
  deliverSoon(db);
  return { done: true };
}

/** What a link to confirm leads to, for whoever holds it. Opening the page changes nothing: mail programs open links, too. */
export function openConfirmation(visit: Visit, token: string): Promise<OpenedAccountLink> {
  return openLink(visit, linkDigest('confirm', token));
}

/** What a link from a mail leads to. */
export async function openLink(visit: Visit, tokenDigest: string): Promise<OpenedAccountLink> {
  const { db, now } = visit;
  if (!(await mayTry(visit, 'link-address', visit.address))) return { state: 'too-often' };
  const link = await findAccountLink(db, systemScope('mail'), tokenDigest);
  if (!link) return { state: 'unknown' };
  if (link.usedAt) return { state: 'used' };
  if (link.expiresAt.getTime() <= now.getTime()) return { state: 'expired' };
  return { state: 'open', email: link.email };
}

/** Somebody says that the address to which the link went is theirs. */
export async function confirmEmail(visit: Visit, { token }: { token: string }): Promise<Done> {
  const { db, now } = visit;
  await countTry(visit, 'link-address', visit.address);
  await inWriteTransaction(db, async (tx) => {
    const link = await consumeAccountLink(tx, systemScope('mail'), {
      tokenDigest: linkDigest('confirm', token),
      at: now,
    });
    if (!link) throw new AppError('conflict', 'This link is used, over or not known. Ask for another mail.');
    const { personId, email, purpose } = link;
    const outcome =
      purpose === 'confirm-email'
        ? await setEmailConfirmed(tx, { personId, email, at: now })
        : await setEmail(tx, { personId, email, confirmedAt: now });
    if (outcome === 'taken')
      throw new AppError('conflict', 'Another account has this address by now. Nothing was changed.');
  });
  return { done: true };
}
