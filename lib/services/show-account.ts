import 'server-only';
import { findAwaitedEmail } from '@/db/queries/account-links';
import { findPersonMail } from '@/db/queries/outgoing-mails';
import { findAccount } from '@/db/queries/people';
import type { SignedIn } from '@/lib/auth/sessions';
import type { Visit } from '@/lib/auth/visit';
import type { ShownAccount } from '@/lib/schemas/account';
import type { SentMail } from '@/lib/schemas/sent-mail';
import { sendsMail } from './queue-mail';

/** What belongs to whoever is signed in: their address, and whether mail reaches it. */
export async function showAccount({ db, now, signedIn }: Visit & { signedIn: SignedIn }): Promise<ShownAccount> {
  const { personId } = signedIn;
  const account = await findAccount(db, personId);
  const mail = await findPersonMail(db, personId);
  return {
    email: account?.email ?? null,
    confirmed: (account?.emailConfirmedAt ?? null) !== null,
    awaited: await findAwaitedEmail(db, personId, now),
    mail: sentMailOf(mail),
    sendsMail: sendsMail(),
  };
}

type Progress = { sentAt: Date | null; nextTryAt: Date | null; refusal: string | null };

/** How far a mail has come, for the screen; null for none. */
export function sentMailOf(mail: Progress | undefined): SentMail | null {
  if (mail === undefined) return null;
  const { sentAt, nextTryAt, refusal } = mail;
  const state = sentAt ? 'sent' : nextTryAt === null ? 'given-up' : refusal === null ? 'waits' : 'refused';
  return { state, refusal, nextTryAt: nextTryAt?.toISOString() ?? null };
}
