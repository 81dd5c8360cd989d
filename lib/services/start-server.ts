import 'server-only';
import { database } from '@/db/client';
import { prepareDatabase } from '@/db/migrate';
import { deleteExpiredDemoCopies } from '@/db/queries/households';
import { deleteExpiredPasskeyChallenges } from '@/db/queries/passkey-challenges';
import { deleteExpiredRateLimits } from '@/db/queries/rate-limits';
import { inWriteTransaction } from '@/db/write';
import { sessionsOf } from '@/lib/auth/sessions';
import { systemScope } from '@/lib/auth/system-scope';
import { environment, now as wallClock } from '@/lib/env';
import { log } from '@/lib/log';
import { keepDemoFresh } from './keep-demo-fresh';

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
  keepDemoFresh(db, wallClock);
}
