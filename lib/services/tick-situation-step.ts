import 'server-only';
import { writeAudit } from '@/db/queries/audit-trail';
import { deleteSituationTick, insertSituationTick } from '@/db/queries/situations';
import { inWriteTransaction } from '@/db/write';
import { type CalendarDay, dayOf } from '@/lib/calendar/household-day';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { Situations } from '@/lib/schemas/situation';
import { drainSeenOn } from '@/lib/situations';
import type { ServiceContext } from './context';
import { requireOpenSituation } from './require-open-situation';
import { showSituations } from './show-situations';

type Tick = { situationId: string; step: string; done: boolean };

/**
 * Ticks a step of the open procedure, or takes the tick back. The same tick twice is one.
 *
 * Error: `invalid-input` for a step that is not one of its ticks: a dose is ticked on the week sheet, a test by testing.
 */
export async function tickSituationStep(
  context: ServiceContext,
  { situationId, step, done }: Tick,
): Promise<Situations> {
  const { db, access, now } = context;
  assertMay(access, 'open-situations');
  const { householdId, personId } = access;
  const { open } = await showSituations(context);
  if (open?.id === situationId && !open.procedure.steps.some(({ id, kind }) => id === step && kind === 'tick'))
    throw new AppError('invalid-input', 'This step is not one to tick.', {
      problems: [{ path: 'step', message: 'Load the page again: the steps have changed.' }],
    });
  if (done && isDrainOfALaterDay(step, dayOf(now.getTime(), access.timeZone)))
    throw new AppError('invalid-input', 'This can be ticked on its day: look at the drain in the morning.', {
      problems: [{ path: 'step', message: 'It can be ticked on its day.' }],
    });
  await inWriteTransaction(db, async (tx) => {
    await requireOpenSituation(tx, { householdId, id: situationId });
    if (done) await insertSituationTick(tx, { householdId, situationId, step, doneAt: now, doneBy: personId });
    else await deleteSituationTick(tx, { householdId, situationId, step });
    const detail = { step, done };
    await writeAudit(tx, { householdId, personId, at: now, action: 'tick-situation', subjectId: situationId, detail });
  });
  return showSituations(context);
}

function isDrainOfALaterDay(step: string, today: CalendarDay): boolean {
  const prefix = drainSeenOn('');
  return step.startsWith(prefix) && step.slice(prefix.length) > today;
}
