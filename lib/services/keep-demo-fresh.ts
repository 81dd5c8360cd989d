import 'server-only';
import type { Database } from '@/db/client';
import { logFault } from '@/lib/log';
import { seedDemo } from './seed-demo';

const quarterOfAnHour = 15 * 60_000;

/**
 * Makes the demo household of today now, and that of each new day within a quarter of an hour, so that nobody who looks
 * round has to wait for it. Does not keep the process alive. Work goes on behind the caller's back; a fault is logged.
 */
export function keepDemoFresh(db: Database, now: () => Date): void {
  const makeIt = () => {
    seedDemo(db, now()).catch((error: unknown) => logFault(error, { task: 'seed-demo' }));
  };
  makeIt();
  setInterval(makeIt, quarterOfAnHour).unref();
}
