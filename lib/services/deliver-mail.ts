import 'server-only';
import type { Database } from '@/db/client';
import { claimDueMails, markRefused, markSent, type OutgoingMail } from '@/db/queries/outgoing-mails';
import { systemScope } from '@/lib/auth/system-scope';
import { environment, type MailWay, now as wallClock } from '@/lib/env';
import { log, logFault } from '@/lib/log';
import { sendMail } from '@/lib/mail/send-mail';

const minute = 60_000;
/** Minutes after each refusal; then the mail is given up. A mail server that is away for a night is back by then. */
const waits = [1, 5, 30, 120, 480];
/** So long somebody else leaves alone what is being sent. */
const CLAIMED_FOR = 10 * minute;
const AT_ONCE = 20;
const EVERY = 15_000;

/** Sends what is due. @returns how many mails left, and how many were refused */
export async function deliverDueMails(
  db: Database,
  now: Date,
  way: MailWay,
): Promise<{ sent: number; refused: number }> {
  const count = { sent: 0, refused: 0 };
  if (way.way === 'none') return count;
  const scope = systemScope('mail');
  const due = await claimDueMails(db, scope, { now, until: new Date(now.getTime() + CLAIMED_FOR), most: AT_ONCE });
  for (const mail of due) {
    const refusal = way.way === 'local' ? null : await sendMail(way, worded(mail));
    count[refusal === null ? 'sent' : 'refused'] += 1;
    if (refusal === null) await markSent(db, scope, { id: mail.id, at: now, keepWords: way.way === 'local' });
    else {
      const wait = waits[mail.tries - 1];
      const nextTryAt = wait === undefined ? null : new Date(now.getTime() + wait * minute);
      await markRefused(db, scope, { id: mail.id, refusal, nextTryAt });
      // Whom it was for and what the server said of them stays in the row, where its household sees it.
      log().warn({ mail: mail.id, tries: mail.tries, givenUp: nextTryAt === null }, 'mail refused');
    }
  }
  return count;
}

function worded({ email, subject, text, html }: OutgoingMail) {
  return { email, subject, text: text ?? '', html: html ?? '' };
}

/** Sends what was just written, behind the caller's back: nobody waits for a mail server. */
export function deliverSoon(db: Database): void {
  deliverDueMails(db, wallClock(), environment().mail).catch((error: unknown) => logFault(error, { task: 'mail' }));
}

/** Sends what is due from now on, every quarter of a minute. Does not keep the process alive. */
export function keepMailGoing(db: Database): void {
  deliverSoon(db);
  setInterval(() => deliverSoon(db), EVERY).unref();
}
