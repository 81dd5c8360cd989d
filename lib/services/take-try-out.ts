import 'server-only';
import type { Transaction } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { findCurrentPlan } from '@/db/queries/plans';
import { findTryOut, insertTryOut } from '@/db/queries/try-outs';
import { listWeekDays, saveWeekDay } from '@/db/queries/week-days';
import type { FormerDay } from '@/db/schema/try-outs';
import { inWriteTransaction } from '@/db/write';
import { addDays } from '@/lib/calendar/household-day';
import { assertMay } from '@/lib/auth/permissions';
import { sharedEngine } from '@/lib/engine-worker/shared-engine';
import { AppError } from '@/lib/errors';
import { movesOf, tried, wishesOf } from '@/lib/planner/wishes-of';
import type { Done } from '@/lib/schemas/account';
import type { Scenario } from '@/lib/schemas/scenario';
import type { TryOut, TryOutChanges } from '@/lib/schemas/try-out';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import type { ServiceContext } from './context';
import { inputHashOf } from './make-plan';
import { daysOf } from './try-out-days';
import { type LoadedStart, loadTryOutStart } from './try-out-start';
import { loadWeekSnapshot } from './week-snapshot';

/**
 * Takes what was tried into the plan: what it says of days is said of them from then on, what it wishes of doses the plan
 * is made around. The plan is worked out with it first, and nothing is kept of what the limits refuse. Sent twice it is
 * taken once.
 *
 * Errors: `conflict` when the plan has changed since, or cannot be changed; `invalid-input` for what cannot be tried;
 * `plan-refused` when it breaks a limit.
 */
export async function takeTryOut(context: ServiceContext, { id, planId, ...changes }: TryOut): Promise<Done> {
  const { db, access, now } = context;
  assertMay(access, 'plan');
  const { householdId, personId } = access;
  if (await findTryOut(db, { householdId, id })) return { done: true };
  const start = await loadTryOutStart(context);
  if (start.plan.id !== planId) throw planChanged();
  assertPossible(changes, start);
  await assertAllowed(tried(start.scenario, changes, start));

  await inWriteTransaction(db, async (tx) => {
    if (await findTryOut(tx, { householdId, id })) return;
    await assertStillStands(tx, context, start);
    const former = await sayOfDays(tx, context, changes);
    const wishes = wishesOf(changes, start, start.scenario);
    const row = { id, householdId, personId, takenAt: now, readingId: start.readingId, changes, wishes, former };
    if (!(await insertTryOut(tx, row)))
      throw new AppError('conflict', 'This was taken into the plan of another household.');
    await writeAudit(tx, {
      householdId,
      personId,
      at: now,
      action: 'take-try-out',
      subjectId: id,
      detail: { changes },
    });
  });
  await bringPlanUpToDate(context);
  return { done: true };
}

function assertPossible(changes: TryOutChanges, start: LoadedStart): void {
  const days = [...changes.swimmers, ...changes.sky].map(({ day }) => day);
  const { tablets, moves } = changes;
  const problems = [
    ...(days.length === 0 && moves.length === 0 && tablets === null
      ? [{ path: 'swimmers', message: 'Nothing was changed.' }]
      : []),
    ...(days.some((day) => day < start.days.first || day > start.days.last)
      ? [{ path: 'swimmers', message: 'Only the days from today to the end of the plan can be tried.' }]
      : []),
    ...(tablets !== null && tablets > start.mostTablets
      ? [{ path: 'tablets', message: `No more than ${start.mostTablets} slow tablets may go in this week.` }]
      : []),
    ...(movesOf(changes, start, start.scenario).length < moves.length
      ? [{ path: 'moves', message: 'This dose cannot go in on that evening.' }]
      : []),
  ];
  if (problems[0]) throw new AppError('invalid-input', problems[0].message, { problems });
}

/** Works out the plan with what was tried: the engine's safety net decides. */
async function assertAllowed(scenario: Scenario): Promise<void> {
  try {
    await sharedEngine().run('plan', scenario);
  } catch (error) {
    if (!(error instanceof AppError) || error.code !== 'plan-refused') throw error;
    throw new AppError(
      'plan-refused',
      'With this the plan would go past one of its limits, so nothing was changed. Try less, or another evening.',
      { cause: error },
    );
  }
}

/** Whatever was sent meanwhile has to be looked at first. */
async function assertStillStands(tx: Transaction, { access }: ServiceContext, start: LoadedStart): Promise<void> {
  const plan = await findCurrentPlan(tx, access.householdId);
  const snapshot = await loadWeekSnapshot(tx, access.householdId, access.timeZone);
  if (plan?.id !== start.plan.id || !snapshot || inputHashOf(snapshot) !== start.inputHash) throw planChanged();
}

/** Says of the days what was tried, and tells what was said of them before. */
async function sayOfDays(tx: Transaction, { access }: ServiceContext, changes: TryOutChanges): Promise<FormerDay[]> {
  const { householdId } = access;
  const former: FormerDay[] = [];
  for (const { day, values } of daysOf(changes)) {
    const [said] = await listWeekDays(tx, { householdId, from: day, until: addDays(day, 1) });
    former.push({
      day,
      ...(values.swimmerHours === undefined ? {} : { swimmerHours: said?.swimmerHours ?? null }),
      ...(values.sky === undefined ? {} : { sky: said?.sky ?? null }),
    });
    await saveWeekDay(tx, { householdId, day, values });
  }
  return former;
}

function planChanged(): AppError {
  return new AppError('conflict', 'The plan has changed meanwhile. Look at the new one, then try it again.');
}
