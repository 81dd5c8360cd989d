import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { listGivenDoses } from '@/db/queries/plan-doses';
import { listPlans } from '@/db/queries/plans';
import type { StoredReading } from '@/db/queries/readings';
import { middleOf } from '@/lib/projection/reading-error';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import { limits } from '@/lib/standards/limits';
import { falseZeroQuestion } from '@/lib/verdict/false-zero';
import { chlorines } from '@/lib/standards/chlorines';

const HOUR = 3_600_000;

/**
 * Whether a reading of no chlorine may be one of far too much (care rules, part 2). 'open': the person has not answered
 * yet; 'bleached': the answer was that the colour flashed, so there is far too much.
 */
export type ZeroDoubt = 'open' | 'bleached' | null;

export async function zeroDoubtOf(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  reading: StoredReading,
): Promise<ZeroDoubt> {
  if (reading.zeroAnswer === 'flashed') return 'bleached';
  if (reading.zeroAnswer === 'stayed-pale' || reading.values.freeChlorine === undefined) return null;
  const { takenAt, createdAt } = reading;
  const earliest = new Date(takenAt.getTime() - limits.falseZeroAfterDose.value * HOUR);
  const until = new Date(takenAt.getTime() + 1);
  const given = await listGivenDoses(db, { householdId, from: earliest, until });
  const doses = given.flatMap(({ substance, givenAt }) =>
    givenAt !== null && chlorines.includes(substance) ? [givenAt.getTime()] : [],
  );
  const plans = await listPlans(db, { householdId, from: takenAt, until });
  const before = plans.findLast((plan) => plan.createdAt.getTime() < createdAt.getTime());
  const hour = Math.round((takenAt.getTime() - (before?.takenAt.getTime() ?? 0)) / HOUR);
  const question = falseZeroQuestion(
    { value: middleOf(reading.values.freeChlorine), takenAt: takenAt.getTime() },
    before?.result.projection?.freeChlorine.p10[hour],
    doses.length > 0 ? Math.max(...doses) : undefined,
  );
  return question === undefined ? null : 'open';
}
