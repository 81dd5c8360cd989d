import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { endPoolEvent as endStored, hasPoolEvent } from '@/db/queries/pool-events';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Done } from '@/lib/schemas/account';
import type { ServiceContext } from './context';

/** Says that what happened is over, or never was. Error: `not-found` for an event of another household. */
export async function endPoolEvent({ db, access, now }: ServiceContext, { id }: { id: string }): Promise<Done> {
  assertMay(access, 'report-events');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    if (!(await hasPoolEvent(tx, { householdId, id }))) throw new AppError('not-found', 'There is no such event here.');
    await endStored(tx, { householdId, id, at: now, personId });
    await writeAudit(tx, { householdId, personId, at: now, action: 'end-pool-event', subjectId: id });
  });
  return { done: true };
}
