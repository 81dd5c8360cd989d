import 'server-only';
import { assertMay } from '@/lib/auth/permissions';
import type { TryOutStart } from '@/lib/schemas/try-out';
import type { ServiceContext } from './context';
import { loadTryOutStart } from './try-out-start';

/** What somebody needs to try things on the week ahead by themselves. Everybody who may look may try. */
export async function showTryOutStart(context: ServiceContext): Promise<TryOutStart> {
  assertMay(context.access, 'look');
  const { plan, scenario, doses, evenings, mostTablets } = await loadTryOutStart(context);
  return { planId: plan.id, scenario, doses, evenings, mostTablets };
}
