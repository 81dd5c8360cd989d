import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { deleteReading, findReading, replaceReading, type StoredReading } from '@/db/queries/readings';
import type { DatabaseOrTransaction } from '@/db/client';
import { inWriteTransaction } from '@/db/write';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import { assertMay, may } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { NewReading, RecordedReading } from '@/lib/schemas/reading';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import type { ServiceContext } from './context';
import { takenAtOf } from './reading-time';
import { recordedReading } from './recorded-reading';

/** How long somebody who is no owner may correct a test of their own. */
const correctionWindow = 48 * 3_600_000;

/**
 * Corrects a reading; what it was before is kept. Owners correct any, caretakers their own for 48 hours.
 * Errors: `not-found`, `not-allowed`, `invalid-input`.
 */
export async function editReading(context: ServiceContext, id: string, sent: NewReading): Promise<RecordedReading> {
  const { db, access, now } = context;
  const { householdId, personId } = access;
  if (sent.id !== id)
    throw new AppError('invalid-input', 'This correction belongs to another test.', {
      problems: [{ path: 'id', message: 'This correction belongs to another test.' }],
    });
  const corrected = await inWriteTransaction(db, async (tx) => {
    const former = await correctable(tx, access, id, now);
    const reading = { ...sent, takenAt: takenAtOf(sent.takenAt, former.createdAt) };
    await replaceReading(tx, { householdId, reading, replacedBy: personId, now });
    await writeAudit(tx, { householdId, personId, at: now, action: 'edit-reading', subjectId: id });
    return findReading(tx, householdId, id);
  });
  if (!corrected) throw notFound();
  await bringPlanUpToDate(context);
  return recordedReading(corrected, access);
}

/** Takes a reading out of everything that is computed; the record keeps it. Rules and errors as for a correction. */
export async function removeReading(context: ServiceContext, id: string): Promise<{ id: string }> {
  const { db, access, now } = context;
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    await correctable(tx, access, id, now);
    await deleteReading(tx, { householdId, id, now });
    await writeAudit(tx, { householdId, personId, at: now, action: 'delete-reading', subjectId: id });
  });
  await bringPlanUpToDate(context);
  return { id };
}

async function correctable(
  tx: DatabaseOrTransaction,
  access: HouseholdAccess,
  id: string,
  now: Date,
): Promise<StoredReading> {
  assertMay(access, 'enter-tests');
  const reading = await findReading(tx, access.householdId, id);
  if (!reading) throw notFound();
  if (may(access, 'correct-any-test')) return reading;
  if (reading.recordedBy !== access.personId)
    throw new AppError('not-allowed', 'Only an owner can correct the tests of others.');
  if (now.getTime() - reading.createdAt.getTime() > correctionWindow)
    throw new AppError('not-allowed', 'You can correct a test of your own for 48 hours; after that an owner can.');
  return reading;
}

function notFound(): AppError {
  return new AppError('not-found', 'There is no such test. It may have been deleted.');
}
