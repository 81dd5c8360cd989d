import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { findPool, updatePool } from '@/db/queries/pools';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Learnt } from '@/lib/schemas/learnt';
import type { ServiceContext } from './context';
import { showLearnt } from './show-learnt';

/**
 * Lets the pool be learnt anew from now on, because something of it has changed. Tests and doses stay in the record; what
 * they taught goes with the next bringing up to date, which showing it brings about, and plans go by the usual pool again.
 */
export async function forgetLearnt(context: ServiceContext): Promise<Learnt> {
  const { db, access, now } = context;
  const { householdId, personId } = access;
  assertMay(access, 'reset-learning');
  await inWriteTransaction(db, async (tx) => {
    const found = await findPool(tx, householdId);
    if (!found) throw new AppError('not-found', 'This household has no pool.');
    const before = found.pool.learningFrom?.toISOString() ?? null;
    await updatePool(tx, householdId, { learningFrom: now });
    await writeAudit(tx, { householdId, personId, at: now, action: 'forget-learnt', detail: { before } });
  });
  return showLearnt(context);
}
