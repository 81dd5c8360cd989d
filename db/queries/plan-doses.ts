import 'server-only';
import { and, asc, eq, gte, inArray, isNull, lt, or, type SQL } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { doseEvents, people, planDoses, plans } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type StoredDose = Omit<typeof planDoses.$inferSelect, 'householdId'> & {
  planVersion: number;
  doneByName: string | null;
  recordedByName: string | null;
  claimedByName: string | null;
};
export type DoseEvent = typeof doseEvents.$inferSelect;
export type NewDoseEvent = Omit<typeof doseEvents.$inferInsert, 'householdId'>;
export type DoseChanges = Partial<
  Pick<
    typeof planDoses.$inferInsert,
    | 'status'
    | 'givenAt'
    | 'givenAmount'
    | 'doneBy'
    | 'recordedBy'
    | 'tickedAt'
    | 'claimedBy'
    | 'claimedAt'
    | 'planVersionSeen'
    | 'doubtfulAt'
  >
>;

const doers = alias(people, 'doers');
const recorders = alias(people, 'recorders');
const claimers = alias(people, 'claimers');

/**
 * The doses that count between `from` and `until` (not included): those of the current plan, and those of earlier plans
 * that were ticked. A dose that an earlier plan only promised is gone with it.
 */
export async function listDoses(
  db: DatabaseOrTransaction,
  { householdId, from, until }: { householdId: ProvenHouseholdId; from: Date; until: Date },
): Promise<StoredDose[]> {
  const counts = or(isNull(plans.supersededAt), inArray(planDoses.status, ['given', 'changed', 'skipped']));
  return readWhere(db, householdId, and(counts, gte(planDoses.at, from), lt(planDoses.at, until)));
}

/** What really went in between `from` and `until` (not included), by the moment it went in. */
export async function listGivenDoses(
  db: DatabaseOrTransaction,
  { householdId, from, until }: { householdId: ProvenHouseholdId; from: Date; until: Date },
): Promise<StoredDose[]> {
  return readWhere(db, householdId, and(gte(planDoses.givenAt, from), lt(planDoses.givenAt, until)));
}

export async function findDose(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  id: string,
): Promise<StoredDose | null> {
  const [dose] = await readWhere(db, householdId, eq(planDoses.id, id));
  return dose ?? null;
}

/**
 * Writes a tick and what it changes. Takes a transaction, as the dose was read in it.
 *
 * @returns "already-recorded" when a tick with this id was sent before: then nothing changes
 */
export async function recordDoseEvent(
  tx: Transaction,
  { householdId, event, changes }: { householdId: ProvenHouseholdId; event: NewDoseEvent; changes: DoseChanges },
): Promise<'recorded' | 'already-recorded'> {
  const added = await tx
    .insert(doseEvents)
    .values({ ...event, householdId })
    .onConflictDoNothing({ target: doseEvents.id })
    .returning({ id: doseEvents.id });
  if (added.length === 0) return 'already-recorded';
  await tx
    .update(planDoses)
    .set(changes)
    .where(and(eq(planDoses.householdId, householdId), eq(planDoses.id, event.doseId)));
  return 'recorded';
}

/** Every tick of a dose, oldest first. */
export async function listDoseEvents(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  doseId: string,
): Promise<DoseEvent[]> {
  return db
    .select()
    .from(doseEvents)
    .where(and(eq(doseEvents.householdId, householdId), eq(doseEvents.doseId, doseId)))
    .orderBy(asc(doseEvents.createdAt), asc(doseEvents.id));
}

async function readWhere(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  condition: SQL | undefined,
): Promise<StoredDose[]> {
  const rows = await db
    .select({
      dose: planDoses,
      planVersion: plans.version,
      doneByName: doers.name,
      recordedByName: recorders.name,
      claimedByName: claimers.name,
    })
    .from(planDoses)
    .innerJoin(plans, eq(plans.id, planDoses.planId))
    .leftJoin(doers, eq(doers.id, planDoses.doneBy))
    .leftJoin(recorders, eq(recorders.id, planDoses.recordedBy))
    .leftJoin(claimers, eq(claimers.id, planDoses.claimedBy))
    .where(and(eq(planDoses.householdId, householdId), condition))
    .orderBy(asc(planDoses.at), asc(planDoses.id));
  return rows.map(({ dose: { householdId: _household, ...dose }, ...names }) => ({ ...dose, ...names }));
}
