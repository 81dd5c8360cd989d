import 'server-only';
import type { Transaction } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { findTryOut, listTakenTryOuts, markPutBack, setFormerDays, type StoredTryOut } from '@/db/queries/try-outs';
import { listWeekDays, saveWeekDay } from '@/db/queries/week-days';
import { inWriteTransaction } from '@/db/write';
import { addDays, dayOf } from '@/lib/calendar/household-day';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Done } from '@/lib/schemas/account';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import type { ServiceContext } from './context';
import { daysOf } from './try-out-days';

const quantities = ['swimmerHours', 'sky'] as const;

/**
 * Puts a try-out back: its wishes are dropped, and its days say again what they said before, from today on and where nobody
 * has said something else since. Put back twice is put back once. Error: `not-found` for one of another household.
 */
export async function putBackTryOut(context: ServiceContext, { id }: { id: string }): Promise<Done> {
  const { db, access, now } = context;
  assertMay(access, 'plan');
  const { householdId, personId } = access;
  await inWriteTransaction(db, async (tx) => {
    const tryOut = await findTryOut(tx, { householdId, id });
    if (!tryOut) throw new AppError('not-found', 'There is no such try-out here.');
    if (tryOut.putBackAt) return;
    await markPutBack(tx, { householdId, id, at: now, personId });
    await restoreDays(tx, context, tryOut);
    await writeAudit(tx, { householdId, personId, at: now, action: 'put-back-try-out', subjectId: id });
  });
  await bringPlanUpToDate(context);
  return { done: true };
}

async function restoreDays(tx: Transaction, { access, now }: ServiceContext, tryOut: StoredTryOut): Promise<void> {
  const { householdId, timeZone } = access;
  const today = dayOf(now.getTime(), timeZone);
  const later = await listTakenTryOuts(tx, { householdId, since: tryOut.takenAt });
  for (const { day, values } of daysOf(tryOut.changes)) {
    const before = tryOut.former.find((each) => each.day === day);
    const [said] = await listWeekDays(tx, { householdId, from: day, until: addDays(day, 1) });
    if (!before || !said || day < today) continue;
    for (const quantity of quantities) {
      const [former, ours] = [before[quantity], values[quantity]];
      if (former === undefined) continue;
      // A later try-out found ours there: what it will put back is what stood there before us.
      const successor = later.find((each) => each.former.some((other) => other.day === day && quantity in other));
      if (successor) {
        successor.former = successor.former.map((other) =>
          other.day === day && other[quantity] === ours ? { ...other, [quantity]: former } : other,
        );
        await setFormerDays(tx, { householdId, id: successor.id, former: successor.former });
      } else if (said[quantity] === ours) await saveWeekDay(tx, { householdId, day, values: { [quantity]: former } });
    }
  }
}
