import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { findReading, insertReading } from '@/db/queries/readings';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { NewReading, RecordedReading } from '@/lib/schemas/reading';
import type { ServiceContext } from './context';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import { takenAtOf } from './reading-time';
import { recordedReading } from './recorded-reading';

/**
 * Records a reading, then brings the week's plan up to date with it. Sent twice it stands there once, as it was sent first.
 *
 * The reading is committed before the plan is computed: a fault in the planner may cost a plan, never a reading.
 * Errors: `not-allowed`, `invalid-input` for a test of the future, `conflict` for an id that is taken.
 */
export async function recordReading(context: ServiceContext, sent: NewReading): Promise<RecordedReading> {
  const { db, access, now } = context;
  const { householdId, personId } = access;
  assertMay(access, 'enter-tests');
  const reading = { ...sent, takenAt: takenAtOf(sent.takenAt, now) };
  await inWriteTransaction(db, async (tx) => {
    const outcome = await insertReading(tx, { householdId, reading, doneBy: personId, recordedBy: personId, now });
    if (outcome === 'added')
      await writeAudit(tx, { householdId, personId, at: now, action: 'record-reading', subjectId: reading.id });
  });
  await bringPlanUpToDate(context);
  const recorded = await findReading(db, householdId, reading.id);
  if (!recorded) throw new AppError('conflict', 'This test was sent before and has been deleted since.');
  return recordedReading(recorded, access);
}
