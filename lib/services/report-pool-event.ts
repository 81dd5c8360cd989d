import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { hasPoolEvent, insertPoolEvent } from '@/db/queries/pool-events';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Done } from '@/lib/schemas/account';
import type { NewPoolEvent } from '@/lib/schemas/pool-event';
import type { ServiceContext } from './context';
import { happenedAtOf } from './reading-time';

/** Writes down what happened to the pool; from then on the verdict knows. The same event twice is written once. */
export async function reportPoolEvent({ db, access, now }: ServiceContext, event: NewPoolEvent): Promise<Done> {
  assertMay(access, 'report-events');
  const { householdId, personId } = access;
  const { id, kind } = event;
  const happenedAt = new Date(happenedAtOf(event.happenedAt, now));
  await inWriteTransaction(db, async (tx) => {
    if (!(await insertPoolEvent(tx, { householdId, personId, id, kind, happenedAt, createdAt: now }))) {
      if (await hasPoolEvent(tx, { householdId, id })) return;
      throw new AppError('conflict', 'This was written down in another household.');
    }
    const detail = { kind, happenedAt: happenedAt.toISOString() };
    await writeAudit(tx, { householdId, personId, at: now, action: 'report-pool-event', subjectId: id, detail });
  });
  return { done: true };
}
