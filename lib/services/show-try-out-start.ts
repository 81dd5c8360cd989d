import 'server-only';
import { assertMay } from '@/lib/auth/permissions';
import type { TryOutStart } from '@/lib/schemas/try-out';
import type { ServiceContext } from './context';
import { loadTryOutStart } from './try-out-start';
import { loadTryOutsInForce } from './try-outs-in-force';

/** What somebody needs to try things on the week ahead by themselves. Everybody who may look may try. */
export async function showTryOutStart(context: ServiceContext): Promise<TryOutStart> {
  const { db, access, now } = context;
  assertMay(access, 'look');
  const { plan, readingId, scenario, doses, evenings, mostTablets } = await loadTryOutStart(context);
  const newest = { id: readingId, takenAt: plan.takenAt };
  return {
    planId: plan.id,
    ...{ scenario, doses, evenings, mostTablets },
    taken: await loadTryOutsInForce(db, access, { newest, now }),
  };
}
