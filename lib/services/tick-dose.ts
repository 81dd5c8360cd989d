import 'server-only';
import type { Transaction } from '@/db/client';
import { writeAudit } from '@/db/queries/audit-trail';
import { wasTickRecorded } from '@/db/queries/dose-events';
import { findDose, listDoseEvents, listDoses, recordDoseEvent, type StoredDose } from '@/db/queries/plan-doses';
import { findCurrentPlan } from '@/db/queries/plans';
import { findShelfProduct, setStock } from '@/db/queries/shelf-products';
import { deleteTabletsFound, saveTabletsFound } from '@/db/queries/tablets-found';
import { inWriteTransaction } from '@/db/write';
import { addDays, startOfDay } from '@/lib/calendar/household-day';
import { assertMay } from '@/lib/auth/permissions';
import { AppError } from '@/lib/errors';
import type { DoseTick } from '@/lib/schemas/plan-dose';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { bringPlanUpToDate } from './bring-plan-up-to-date';
import type { ServiceContext } from './context';
import { isSameDose, wentIn } from './dose-state';
import { transitionOf } from './dose-transition';
import { showWeek } from './show-week';

/**
 * Records what somebody says of a dose (claim, given, changed, skipped, undo), then brings the plan up to date and shows
 * the week of the dose. A tick that was recorded before changes nothing.
 *
 * Errors: `not-allowed`, `not-found`, and those of `transitionOf`.
 */
export async function tickDose(context: ServiceContext, doseId: string, tick: DoseTick): Promise<WeekSheet> {
  const { db, access } = context;
  assertMay(access, 'tick-doses');
  const dose = await inWriteTransaction(db, (tx) => record(tx, context, doseId, tick));
  if (tick.action !== 'claim') await bringPlanUpToDate(context);
  return showWeek(context, { start: dose.day });
}

async function record(
  tx: Transaction,
  { access, now }: ServiceContext,
  doseId: string,
  tick: DoseTick,
): Promise<StoredDose> {
  const { householdId, personId } = access;
  const meant = await findDose(tx, householdId, doseId);
  if (!meant) throw new AppError('not-found', 'There is no such dose in this household.');
  if (await wasTickRecorded(tx, householdId, tick.id)) return meant;
  const dose = await asItStandsNow(tx, access, meant);
  const changes = transitionOf(dose, tick, access, now, await listDoseEvents(tx, householdId, dose.id));
  const after = { ...dose, ...changes };
  const event = {
    id: tick.id,
    doseId: dose.id,
    action: tick.action,
    statusFrom: dose.status,
    statusTo: after.status,
    amountFrom: dose.givenAmount,
    amountTo: after.givenAmount,
    givenAtFrom: dose.givenAt,
    givenAtTo: after.givenAt,
    planVersionSeen: tick.planVersion,
    recordedBy: personId,
    createdAt: now,
  };
  const outcome = await recordDoseEvent(tx, {
    householdId,
    event,
    changes: { ...changes, planVersionSeen: tick.planVersion },
  });
  if (outcome === 'already-recorded') throw new AppError('conflict', 'This tick was recorded in another household.');
  await countStock(tx, access, dose, usedOf(dose) - usedOf(after));
  await keepTabletsLeft(tx, access, after, tick);
  const doubt = after.doubtfulAt !== null && dose.doubtfulAt === null;
  await writeAudit(tx, {
    ...{ householdId, personId, at: now, action: 'tick-dose', subjectId: dose.id },
    detail: {
      tick: tick.action,
      amount: after.givenAmount,
      ...tabletsLeftOf(tick),
      ...(doubt ? { suspected: 'double-dose' } : {}),
    },
  });
  return dose;
}

/**
 * The dose that a tick is about today. Whoever ticks may look at an old plan: where a newer one has the same product on
 * the same day, or somebody ticked that one already, it is that dose and not a second one.
 */
async function asItStandsNow(
  tx: Transaction,
  { householdId, timeZone }: ServiceContext['access'],
  meant: StoredDose,
): Promise<StoredDose> {
  const current = await findCurrentPlan(tx, householdId);
  if (meant.planId === current?.id || meant.status !== 'planned') return meant;
  const from = new Date(startOfDay(meant.day, timeZone));
  const until = new Date(startOfDay(addDays(meant.day, 1), timeZone));
  const twins = (await listDoses(tx, { householdId, from, until })).filter((dose) => isSameDose(dose, meant));
  return twins.find(wentIn) ?? twins[0] ?? meant;
}

/** What a tick says was left in the feeder. */
function tabletsLeftOf(tick: DoseTick): { tabletsLeft?: number } {
  if (tick.action !== 'given' && tick.action !== 'changed') return {};
  return tick.tabletsLeft === undefined ? {} : { tabletsLeft: tick.tabletsLeft };
}

/** What was found in the feeder stays with the dose that was put in then, and goes with it. */
async function keepTabletsLeft(
  tx: Transaction,
  { householdId }: ServiceContext['access'],
  after: Pick<StoredDose, 'id' | 'status'>,
  tick: DoseTick,
): Promise<void> {
  const { tabletsLeft } = tabletsLeftOf(tick);
  if (!wentIn(after)) await deleteTabletsFound(tx, { householdId, doseId: after.id });
  else if (tabletsLeft !== undefined)
    await saveTabletsFound(tx, { householdId, doseId: after.id, tablets: tabletsLeft });
}

/** How much is in the water by this dose, in its own unit. */
function usedOf({ status, givenAmount }: Pick<StoredDose, 'status' | 'givenAmount'>): number {
  return wentIn({ status }) ? (givenAmount ?? 0) : 0;
}

/** What goes in comes off the shelf; more than was known to be there leaves nothing. */
async function countStock(
  tx: Transaction,
  { householdId }: ServiceContext['access'],
  { productId, unit }: StoredDose,
  change: number,
): Promise<void> {
  const product = productId === null || change === 0 ? null : await findShelfProduct(tx, householdId, productId);
  if (!product) return;
  const each = unit === 'tablet' ? (product.tabletMass ?? 0) : 1;
  await setStock(tx, { householdId, id: product.id, stock: Math.max(0, product.stock + change * each) });
}
