import 'server-only';
import { createHmac, timingSafeEqual } from 'node:crypto';
import { listKeptMails } from '@/db/queries/outgoing-mails';
import { systemScope } from '@/lib/auth/system-scope';
import type { Visit } from '@/lib/auth/visit';
import { environment } from '@/lib/env';
import { countTry, isUsedUp } from '@/lib/auth/rate-limit';

export type KeptMail = { id: string; email: string; subject: string; text: string; html: string; createdAt: string };

/** Whether mail is kept on a page of this machine: it exists nowhere else. */
export function hasMailbox(): boolean {
  return environment().mail.way === 'local';
}

/** What opens the mailbox: told to whoever started the server, and to nobody else. */
export function mailboxKey(): string {
  return createHmac('sha256', environment().secret).update('mailbox').digest('base64url').slice(0, 24);
}

/** Says where mail is to be read, once, to whoever starts the server. It is no log: a log must not open anything. */
export function announceMailbox(): void {
  if (hasMailbox()) process.stdout.write(`\nMail is kept at ${environment().origin}/mailbox?key=${mailboxKey()}\n`);
}

/** The mail of this machine for whoever has the key, the newest first; null for anybody else, and after too many tries. */
export async function showMailbox(visit: Visit, key: string | undefined): Promise<KeptMail[] | null> {
  if (!hasMailbox() || key === undefined) return null;
  if (await isUsedUp(visit, 'mailbox-address', visit.address)) return null;
  if (!isSame(key, mailboxKey())) {
    await countTry(visit, 'mailbox-address', visit.address);
    return null;
  }
  const mails = await listKeptMails(visit.db, systemScope('mail'));
  return mails.map(({ id, email, subject, text, html, createdAt }) => ({
    id,
    email,
    subject,
    text: text ?? '',
    html: html ?? '',
    createdAt: createdAt.toISOString(),
  }));
}

function isSame(given: string, wanted: string): boolean {
  const digest = (text: string) => createHmac('sha256', environment().secret).update(text).digest();
  return timingSafeEqual(digest(given), digest(wanted));
}
