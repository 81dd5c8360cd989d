const longestWait = 10_000;

/** Whether another connection held the write lock. Drizzle and libSQL wrap each other's errors: the code is a cause. */
export function isBusy(error: unknown): boolean {
  for (let reason = error; reason instanceof Error; reason = reason.cause)
    if ('code' in reason && typeof reason.code === 'string' && reason.code.startsWith('SQLITE_BUSY')) return true;
  return false;
}

/** Tries again while the database is busy, with growing, jittered waits that leave the event loop free. */
export async function retryWhileBusy<T>(attempt: () => Promise<T>, waitAtMost = longestWait): Promise<T> {
  const giveUpAt = performance.now() + waitAtMost;
  for (let wait = 10; ; wait = Math.min(wait * 2, 500)) {
    try {
      return await attempt();
    } catch (error) {
      const pause = wait * (0.5 + Math.random());
      if (!isBusy(error) || performance.now() + pause > giveUpAt) throw error;
      await new Promise((resolve) => setTimeout(resolve, pause));
    }
  }
}
