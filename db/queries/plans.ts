import 'server-only';
import { and, asc, desc, eq, gt, isNull, lt, max } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { planDoses, planFailures, plans } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type StoredPlan = Omit<typeof plans.$inferSelect, 'householdId'>;
export type NewPlan = Omit<typeof plans.$inferInsert, 'householdId' | 'version' | 'supersededAt'>;
export type NewPlanDose = Pick<
  typeof planDoses.$inferInsert,
  | 'id'
  | 'day'
  | 'wallTime'
  | 'at'
  | 'productId'
  | 'productName'
  | 'toBuy'
  | 'substance'
  | 'form'
  | 'amount'
  | 'unit'
  | 'rise'
  | 'reason'
  | 'effect'
>;

const columns = {
  id: plans.id,
  version: plans.version,
  engineVersion: plans.engineVersion,
  inputHash: plans.inputHash,
  readingId: plans.readingId,
  takenAt: plans.takenAt,
  endsAt: plans.endsAt,
  createdAt: plans.createdAt,
  snapshot: plans.snapshot,
  result: plans.result,
  supersededAt: plans.supersededAt,
};

/** The newest plan; null before the first. */
export async function findCurrentPlan(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
): Promise<StoredPlan | null> {
  const [plan] = await db
    .select(columns)
    .from(plans)
    .where(and(eq(plans.householdId, householdId), isNull(plans.supersededAt)));
  return plan ?? null;
}

/** Every plan, old ones too, whose hours touch `from` up to `until`, in the order in which they were made. */
export async function listPlans(
  db: DatabaseOrTransaction,
  { householdId, from, until }: { householdId: ProvenHouseholdId; from: Date; until: Date },
): Promise<StoredPlan[]> {
  return db
    .select(columns)
    .from(plans)
    .where(and(eq(plans.householdId, householdId), gt(plans.endsAt, from), lt(plans.takenAt, until)))
    .orderBy(asc(plans.version));
}

/**
 * Stores a plan with its doses as the household's newest; the one before stays as it was promised and is superseded.
 * Takes a transaction: between the two writes there must be no moment without a current plan.
 *
 * @returns its version
 */
export async function insertPlan(
  tx: Transaction,
  { householdId, plan, doses }: { householdId: ProvenHouseholdId; plan: NewPlan; doses: readonly NewPlanDose[] },
): Promise<number> {
  const [newest] = await tx
    .select({ version: max(plans.version) })
    .from(plans)
    .where(eq(plans.householdId, householdId));
  const version = (newest?.version ?? 0) + 1;
  await tx
    .update(plans)
    .set({ supersededAt: plan.createdAt })
    .where(and(eq(plans.householdId, householdId), isNull(plans.supersededAt)));
  await tx.insert(plans).values({ ...plan, householdId, version });
  if (doses.length > 0)
    await tx.insert(planDoses).values(doses.map((dose) => ({ ...dose, householdId, planId: plan.id })));
  return version;
}

export async function insertPlanFailure(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  failure: Omit<typeof planFailures.$inferInsert, 'householdId'>,
): Promise<void> {
  await db.insert(planFailures).values({ ...failure, householdId });
}

/** The newest failure; the caller compares its instant with the current plan's. */
export async function findLatestPlanFailure(db: DatabaseOrTransaction, householdId: ProvenHouseholdId) {
  const [failure] = await db
    .select()
    .from(planFailures)
    .where(eq(planFailures.householdId, householdId))
    .orderBy(desc(planFailures.failedAt))
    .limit(1);
  return failure ?? null;
}
