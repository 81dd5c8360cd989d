import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { hasVisit, insertVisit } from '@/db/queries/visits';
import { inWriteTransaction } from '@/db/write';
import { dayOf } from '@/lib/calendar/household-day';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { NewVisit, Visits } from '@/lib/schemas/visit';
import type { ServiceContext } from './context';
import { showVisits } from './show-visits';

/** Keeps a professional's visit: the day by the household's calendar, and what was done. */
export async function recordVisit(context: ServiceContext, { id, visitedOn, note }: NewVisit): Promise<Visits> {
  const { db, access, now } = context;
  assertMay(access, 'keep-house-notes');
  const { householdId, personId, timeZone } = access;
  if (visitedOn > dayOf(now.getTime(), timeZone)) {
    const message = 'A visit cannot be later than today.';
    throw new AppError('invalid-input', message, {
      problems: [{ path: 'visitedOn', message: `${message} Check the day.` }],
    });
  }
  await inWriteTransaction(db, async (tx) => {
    const row = { id, householdId, visitedOn, note: note ?? null, createdAt: now, recordedBy: personId };
    if (!(await insertVisit(tx, row))) {
      if (await hasVisit(tx, { householdId, id })) return;
      throw new AppError('conflict', 'This visit was written down in another household.');
    }
    const detail = { visitedOn, note };
    await writeAudit(tx, { householdId, personId, at: now, action: 'record-visit', subjectId: id, detail });
  });
  return showVisits(context);
}
