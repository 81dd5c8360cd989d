import 'server-only';
import { randomUUID } from 'node:crypto';
import type { Transaction } from '@/db/client';
import { setClaim } from '@/db/queries/dose-claims';
import { listDoses, type StoredDose } from '@/db/queries/plan-doses';
import { insertPlan, type NewPlanDose, type StoredPlan } from '@/db/queries/plans';
import { listShelfProducts } from '@/db/queries/shelf-products';
import { dayOf } from '@/lib/calendar/household-day';
import { wallTimeOf } from '@/lib/calendar/wall-time';
import type { HouseholdAccess } from '@/lib/auth/household-access';
import type { WeekPlan } from '@/lib/schemas/plan';
import { claimLasts, isSameDose } from './dose-state';
import type { WeekSnapshot } from './week-snapshot';

const HOUR = 3_600_000;
const HOURS_OF_A_PLAN = 168;

type Made = { snapshot: WeekSnapshot; inputHash: string; result: WeekPlan; now: Date };

/**
 * Stores a plan with its doses as the newest version. Doses of the one before that nobody ticked go with it; whoever said
 * "I am adding it now" of one still has its successor.
 */
export async function storePlan(
  tx: Transaction,
  { householdId, timeZone }: Pick<HouseholdAccess, 'householdId' | 'timeZone'>,
  { snapshot, inputHash, result, now }: Made,
): Promise<StoredPlan> {
  const takenAt = new Date(result.takenAt);
  const plan = {
    id: randomUUID(),
    engineVersion: result.engineVersion,
    inputHash,
    readingId: snapshot.readingId,
    takenAt,
    endsAt: new Date(takenAt.getTime() + HOURS_OF_A_PLAN * HOUR),
    createdAt: now,
    snapshot: snapshot.scenario,
    result,
  };
  const names = new Map((await listShelfProducts(tx, householdId)).map(({ id, name }) => [id, name]));
  const doses = result.doses.map((dose): NewPlanDose => {
    const at = new Date(dose.at);
    return {
      id: randomUUID(),
      day: dayOf(at.getTime(), timeZone),
      wallTime: wallTimeOf(at.getTime(), timeZone),
      at,
      // What the shelf no longer holds enough of has to be bought: it is kept as no product of the shelf.
      productId: dose.toBuy ? null : dose.product,
      productName: dose.toBuy || dose.product === null ? null : (names.get(dose.product) ?? null),
      toBuy: dose.toBuy,
      substance: dose.substance,
      form: dose.form,
      amount: dose.amount,
      unit: dose.unit,
      rise: dose.rise,
      reason: dose.reason,
      effect: dose.effect ?? null,
    };
  });
  const claimed = await claimedDoses(tx, householdId, takenAt, now);
  const version = await insertPlan(tx, { householdId, plan, doses });
  for (const former of claimed) {
    const successor = doses.find((dose) => isSameDose(dose, former));
    if (successor && former.claimedBy !== null && former.claimedAt !== null)
      await setClaim(tx, {
        householdId,
        doseId: successor.id,
        claimedBy: former.claimedBy,
        claimedAt: former.claimedAt,
      });
  }
  return { ...plan, version, supersededAt: null };
}

async function claimedDoses(
  tx: Transaction,
  householdId: HouseholdAccess['householdId'],
  from: Date,
  now: Date,
): Promise<StoredDose[]> {
  const until = new Date(now.getTime() + HOURS_OF_A_PLAN * HOUR);
  const doses = await listDoses(tx, {
    householdId,
    from: new Date(Math.min(from.getTime(), now.getTime()) - 24 * HOUR),
    until,
  });
  return doses.filter((dose) => dose.status === 'planned' && claimLasts(dose, now));
}
