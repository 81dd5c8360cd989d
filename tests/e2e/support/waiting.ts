import { setTimeout as pause } from 'node:timers/promises';

/** Asks again and again until the answer is yes. @returns whether it was in time */
export async function until(
  ask: () => boolean | Promise<boolean>,
  { seconds = 10, every = 50 }: { seconds?: number; every?: number } = {},
): Promise<boolean> {
  const end = performance.now() + seconds * 1000;
  while (performance.now() < end) {
    if (await ask()) return true;
    await pause(every);
  }
  return false;
}
