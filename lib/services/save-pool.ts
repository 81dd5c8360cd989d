import 'server-only';
import type { Transaction } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { updateHousehold } from '@/db/queries/households';
import { markHandlesChemicals } from '@/db/queries/memberships';
import { updatePool } from '@/db/queries/pools';
import { inWriteTransaction } from '@/db/write';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import { type SetupAnswer, type SetupState, type SetupStep, setupSteps } from '@/lib/schemas/pool-profile';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import type { ServiceContext } from './context';
import { columnsOf } from './pool-columns';
import { readPool } from './read-pool';

/**
 * Saves one part of the pool's profile, in the first run or later. The first run can be left after any part and taken up
 * again; it is finished when its last part is saved and nothing says that Wadewell is not for this pool.
 */
export async function savePool({ db, access, now }: ServiceContext, answer: SetupAnswer): Promise<SetupState> {
  assertMay(access, 'change-pool');
  const state = await inWriteTransaction(db, (tx) => saveAnswer(tx, { access, now }, answer));
  const timeZone = state.profile.sun?.timeZone ?? access.timeZone;
  if (state.completed) await bringPlanUpToDate({ db, access: { ...access, timeZone }, now });
  return state;
}

async function saveAnswer(
  tx: Transaction,
  { access, now }: Pick<ServiceContext, 'access' | 'now'>,
  answer: SetupAnswer,
): Promise<SetupState> {
  const { householdId, personId } = access;

  const before = await readPool({ db: tx, access });
  const nextStep = stepAfter(answer.step, before.nextStep);
  await updatePool(tx, householdId, { ...columnsOf(answer, personId), nextStep });
  const asked = { ...access, ...(await saveBesidePool(tx, { access, now }, answer)) };

  const { decision } = await readPool({ db: tx, access: asked });
  const finishes = nextStep === null && decision.result !== 'stop' && !before.completed;
  await updatePool(tx, householdId, {
    recordOnly: decision.result !== 'ok',
    ...(finishes ? { completedAt: now } : {}),
  });
  await writeAudit(tx, { householdId, personId, at: now, action: 'save-pool', detail: { step: answer.step } });
  return readPool({ db: tx, access: asked });
}

/** Earlier parts can be answered again at any time; one that lies further ahead waits for those before it. */
function stepAfter(answered: SetupStep, next: SetupStep | null): SetupStep | null {
  if (next === null) return null;
  const place = setupSteps.indexOf(answered);
  const reached = setupSteps.indexOf(next);
  if (place > reached) throw new AppError('conflict', 'Answer the parts before this one first.');
  return place < reached ? next : (setupSteps[place + 1] ?? null);
}

/** What is asked beside the pool but belongs to the member or to the household. @returns what became of the asker */
async function saveBesidePool(
  tx: Transaction,
  { access, now }: Pick<ServiceContext, 'access' | 'now'>,
  answer: SetupAnswer,
): Promise<{ handlesChemicals?: boolean; timeZone?: string }> {
  const { householdId, membershipId } = access;
  if (answer.step === 'scope') {
    const { handlesChemicals } = answer.answers;
    await markHandlesChemicals(tx, { householdId, membershipId, cardReadAt: handlesChemicals ? now : null });
    return { handlesChemicals };
  }
  if (answer.step === 'sun') {
    const { timeZone } = answer.answers;
    await updateHousehold(tx, householdId, { timeZone });
    return { timeZone };
  }
  return {};
}
