import 'server-only';
import { database } from '@/db/client';
import { prepareDatabase } from '@/db/migrate';
import { deleteOldAccountLinks } from '@/db/queries/account-links';
import { deleteExpiredDemoCopies } from '@/db/queries/households';
import { deleteOldMails } from '@/db/queries/outgoing-mails';
import { deleteExpiredPasskeyChallenges } from '@/db/queries/passkey-challenges';
import { deleteExpiredRateLimits } from '@/db/queries/rate-limits';
import { inWriteTransaction } from '@/db/write';
import { sessionsOf } from '@/lib/auth/sessions';
import { systemScope } from '@/lib/auth/system-scope';
import { environment, now as wallClock } from '@/lib/env';
import { log } from '@/lib/log';
import { keepMailGoing } from './deliver-mail';
import { keepDemoFresh } from './keep-demo-fresh';
import { announceMailbox } from './show-mailbox';

/** Brings the database up to date and clears away what has run out; the server answers nobody before. */
export async function startServer(): Promise<void> {
  const db = database();
  const now = wallClock();
  const surroundings = environment();
  const copy = await prepareDatabase(db, surroundings.databaseUrl, now);
  if (copy !== null) log().info({ copy }, 'the database was copied before it was migrated');
  await sessionsOf(db, surroundings).deleteExpired();
  const scope = systemScope('clean-up');
  await deleteExpiredRateLimits(db, scope, now);
  await deleteExpiredPasskeyChallenges(db, scope, now);
  await inWriteTransaction(db, (tx) => deleteExpiredDemoCopies(tx, scope, now));
  const monthAgo = new Date(now.getTime() - 30 * 24 * 3_600_000);
  await deleteOldMails(db, scope, monthAgo);
  await deleteOldAccountLinks(db, scope, monthAgo);
  keepMailGoing(db);
  announceMailbox();
  keepDemoFresh(db, wallClock);
}
