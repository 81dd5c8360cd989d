import 'server-only';
import { retryWhileBusy } from './busy';
import type { Database, Transaction } from './client';

const longestTransaction = 2_000;

/**
 * Runs a write transaction: all of it or nothing. Transactions of this process take turns; when another process holds
 * the lock the whole of it is tried again, so `work` must not act on anything but `tx`.
 *
 * A transaction that stays open longer than two seconds would hold up every other writer: it is rolled back and fails.
 */
export function inWriteTransaction<T>(
  db: Database,
  work: (tx: Transaction) => Promise<T>,
  openAtMost = longestTransaction,
): Promise<T> {
  return retryWhileBusy(() => db.transaction((tx) => withinTime(work(tx), openAtMost)));
}

async function withinTime<T>(work: Promise<T>, openAtMost: number): Promise<T> {
  let timer: NodeJS.Timeout | undefined;
  const tooLong = new Promise<never>((_, reject) => {
    timer = setTimeout(
      () => reject(new Error(`A write transaction was open for more than ${openAtMost} ms and was rolled back.`)),
      openAtMost,
    );
  });
  try {
    return await Promise.race([work, tooLong]);
  } finally {
    clearTimeout(timer);
  }
}
