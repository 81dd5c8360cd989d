import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { insertPoolEvent } from '@/db/queries/pool-events';
import { hasRound, insertRound } from '@/db/queries/rounds';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { NewRound, Rounds } from '@/lib/schemas/round';
import type { ServiceContext } from './context';
import { happenedAtOf } from './reading-time';
import { showRounds } from './show-rounds';

/** Keeps a round. A drain cover that is not whole also ends the verdict, until somebody says that it is replaced. */
export async function recordRound(context: ServiceContext, round: NewRound): Promise<Rounds> {
  const { db, access, now } = context;
  assertMay(access, 'do-rounds');
  const { householdId, personId } = access;
  const { id, exceptions, pressure, cleanPressure } = round;
  const doneAt = new Date(happenedAtOf(round.doneAt, now, 'doneAt'));
  await inWriteTransaction(db, async (tx) => {
    const row = { id, householdId, doneAt, createdAt: now, doneBy: personId, exceptions, pressure, cleanPressure };
    if (!(await insertRound(tx, row))) {
      if (await hasRound(tx, { householdId, id })) return;
      throw new AppError('conflict', 'This round was written down in another household.');
    }
    if (exceptions.includes('drain-cover'))
      await insertPoolEvent(tx, { id, householdId, personId, kind: 'drain-cover', happenedAt: doneAt, createdAt: now });
    const detail = { exceptions, pressure, cleanPressure };
    await writeAudit(tx, { householdId, personId, at: now, action: 'record-round', subjectId: id, detail });
  });
  return showRounds(context);
}
