import 'server-only';
import { and, eq, inArray, isNull } from 'drizzle-orm';
import type { SQLiteTable } from 'drizzle-orm/sqlite-core';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import {
  doseEvents,
  households,
  memberships,
  people,
  planDoses,
  plans,
  pools,
  posteriors,
  preferences,
  readings,
  readingValues,
  shelfProducts,
  tabletsFound,
  weekDays,
} from '@/db/schema';
import type { ProvenHouseholdId, SystemScope } from '@/lib/schemas/scope';

/** Makes a finished household the one that copies are made of, in place of the one before. */
export async function replaceDemoOriginal(
  tx: Transaction,
  _scope: SystemScope,
  householdId: ProvenHouseholdId,
): Promise<void> {
  const former = await tx
    .select({ id: households.id, personId: memberships.personId })
    .from(households)
    .leftJoin(memberships, eq(memberships.householdId, households.id))
    .where(and(eq(households.demo, true), isNull(households.expiresAt)));
  const members = former.flatMap(({ personId }) => (personId === null ? [] : [personId]));
  await tx.delete(people).where(and(inArray(people.id, members), isNull(people.email)));
  await tx.delete(households).where(
    inArray(
      households.id,
      former.map(({ id }) => id),
    ),
  );
  await tx.update(households).set({ expiresAt: null }).where(eq(households.id, householdId));
}

/** The people of a demo household, by name. */
export async function listDemoPeople(db: DatabaseOrTransaction, _scope: SystemScope, householdId: ProvenHouseholdId) {
  return db
    .select({ id: people.id, name: people.name, role: memberships.role })
    .from(memberships)
    .innerJoin(people, eq(people.id, memberships.personId))
    .where(eq(memberships.householdId, householdId));
}

type Copy = {
  from: ProvenHouseholdId;
  to: ProvenHouseholdId;
  /** The id in the copy of a row or person with an id in the original; the same every time it is asked. */
  idOf: (id: string) => string;
};

/** Copies all that a household has recorded and planned into a new one, which has its row and its people already. */
export async function copyHouseholdRecord(
  tx: Transaction,
  _scope: SystemScope,
  { from, to, idOf }: Copy,
): Promise<void> {
  const person = (id: string | null) => (id === null ? null : idOf(id));
  const householdId = to;

  const [pool] = await tx.select().from(pools).where(eq(pools.householdId, from));
  if (pool)
    await tx
      .update(pools)
      .set({ ...pool, householdId, swimLimitSetBy: person(pool.swimLimitSetBy) })
      .where(eq(pools.householdId, to));
  const shelf = await tx.select().from(shelfProducts).where(eq(shelfProducts.householdId, from));
  await insertAll(
    tx,
    shelfProducts,
    shelf.map((row) => ({ ...row, householdId })),
  );
  const days = await tx.select().from(weekDays).where(eq(weekDays.householdId, from));
  await insertAll(
    tx,
    weekDays,
    days.map((row) => ({ ...row, householdId })),
  );
  const wishes = await tx.select().from(preferences).where(eq(preferences.householdId, from));
  await insertAll(
    tx,
    preferences,
    wishes.map((row) => ({ ...row, householdId })),
  );

  const tests = await tx.select().from(readings).where(eq(readings.householdId, from));
  await insertAll(
    tx,
    readings,
    tests.map((row) => ({
      ...row,
      householdId,
      id: idOf(row.id),
      doneBy: person(row.doneBy),
      recordedBy: person(row.recordedBy),
    })),
  );
  const values = await tx
    .select({ value: readingValues })
    .from(readingValues)
    .innerJoin(readings, eq(readings.id, readingValues.readingId))
    .where(eq(readings.householdId, from));
  await insertAll(
    tx,
    readingValues,
    values.map(({ value }) => ({ ...value, readingId: idOf(value.readingId) })),
  );

  const learnt = await tx.select().from(posteriors).where(eq(posteriors.householdId, from));
  await insertAll(
    tx,
    posteriors,
    learnt.map((row) => ({ ...row, householdId, readingId: idOf(row.readingId) })),
  );

  const made = await tx.select().from(plans).where(eq(plans.householdId, from));
  await insertAll(
    tx,
    plans,
    made.map((row) => ({ ...row, householdId, id: idOf(row.id), readingId: idOf(row.readingId) })),
  );
  const doses = await tx.select().from(planDoses).where(eq(planDoses.householdId, from));
  await insertAll(
    tx,
    planDoses,
    doses.map((row) => ({
      ...row,
      ...{ householdId, id: idOf(row.id), planId: idOf(row.planId) },
      ...{ doneBy: person(row.doneBy), recordedBy: person(row.recordedBy), claimedBy: person(row.claimedBy) },
    })),
  );
  const found = await tx.select().from(tabletsFound).where(eq(tabletsFound.householdId, from));
  await insertAll(
    tx,
    tabletsFound,
    found.map((row) => ({ ...row, householdId, doseId: idOf(row.doseId) })),
  );
  const ticks = await tx.select().from(doseEvents).where(eq(doseEvents.householdId, from));
  await insertAll(
    tx,
    doseEvents,
    ticks.map((row) => ({
      ...row,
      householdId,
      id: idOf(row.id),
      doseId: idOf(row.doseId),
      recordedBy: person(row.recordedBy),
    })),
  );
}

/** A statement carries a limited number of values. */
const rowsAtOnce = 200;

async function insertAll<Table extends SQLiteTable>(
  tx: Transaction,
  table: Table,
  rows: Table['$inferInsert'][],
): Promise<void> {
  for (let first = 0; first < rows.length; first += rowsAtOnce)
    await tx.insert(table).values(rows.slice(first, first + rowsAtOnce));
}
