import 'server-only';
import { and, asc, desc, eq, gte, inArray, isNull, lt, max, type SQL } from 'drizzle-orm';
import { alias } from 'drizzle-orm/sqlite-core';
import type { DatabaseOrTransaction } from '@/db/client';
import { people, readings, readingValues, readingVersions } from '@/db/schema';
import { type MeasuredQuantity, measuredQuantities } from '@/lib/schemas/measured-range';
import type { Measured, NewReading } from '@/lib/schemas/reading';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type StoredReading = Omit<typeof readings.$inferSelect, 'householdId' | 'deletedAt'> & {
  values: Measured;
  /** Names of the two people; null when nobody is known or the account is gone. */
  doneByName: string | null;
  recordedByName: string | null;
};

const doers = alias(people, 'doers');
const recorders = alias(people, 'recorders');

/** Readings taken from `from` up to but not including `until`, newest first. */
export async function listReadings(
  db: DatabaseOrTransaction,
  { householdId, from, until }: { householdId: ProvenHouseholdId; from: Date; until: Date },
): Promise<StoredReading[]> {
  return readWhere(db, householdId, and(gte(readings.takenAt, from), lt(readings.takenAt, until)));
}

export async function findReading(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  id: string,
): Promise<StoredReading | null> {
  const [reading] = await readWhere(db, householdId, eq(readings.id, id));
  return reading ?? null;
}

/** The reading taken last, of one kind or of any; null before the first. */
export async function findLatestReading(
  db: DatabaseOrTransaction,
  { householdId, kind }: { householdId: ProvenHouseholdId; kind?: StoredReading['kind'] },
): Promise<StoredReading | null> {
  const [reading] = await readWhere(db, householdId, kind === undefined ? undefined : eq(readings.kind, kind), 1);
  return reading ?? null;
}

/** When each of some quantities was measured last, however long ago; those that never were are left out. */
export async function lastMeasured(
  db: DatabaseOrTransaction,
  { householdId, quantities }: { householdId: ProvenHouseholdId; quantities: readonly MeasuredQuantity[] },
): Promise<Date[]> {
  const rows = await db
    .select({ takenAt: max(readings.takenAt) })
    .from(readings)
    .innerJoin(readingValues, eq(readingValues.readingId, readings.id))
    .where(
      and(
        eq(readings.householdId, householdId),
        isNull(readings.deletedAt),
        inArray(readingValues.quantity, [...quantities]),
      ),
    )
    .groupBy(readingValues.quantity);
  return rows.flatMap(({ takenAt }) => takenAt ?? []);
}

/**
 * Writes a reading and its values.
 *
 * @returns "already-recorded" when a reading with this id was sent before, by whomever
 */
export async function insertReading(
  db: DatabaseOrTransaction,
  {
    householdId,
    reading,
    doneBy,
    recordedBy,
    now,
  }: {
    householdId: ProvenHouseholdId;
    reading: NewReading;
    doneBy: string | null;
    recordedBy: string | null;
    now: Date;
  },
): Promise<'added' | 'already-recorded'> {
  const added = await db
    .insert(readings)
    .values({ ...columnsOf(reading), id: reading.id, householdId, doneBy, recordedBy, createdAt: now })
    .onConflictDoNothing()
    .returning({ id: readings.id });
  if (added.length === 0) return 'already-recorded';
  await db.insert(readingValues).values(valueRows(reading));
  return 'added';
}

/**
 * Replaces a reading by its correction and keeps what it was.
 *
 * @returns whether the household has such a reading
 */
export async function replaceReading(
  db: DatabaseOrTransaction,
  {
    householdId,
    reading,
    replacedBy,
    now,
  }: { householdId: ProvenHouseholdId; reading: NewReading; replacedBy: string | null; now: Date },
): Promise<boolean> {
  const former = await findReading(db, householdId, reading.id);
  if (!former) return false;
  await db
    .insert(readingVersions)
    .values({ readingId: reading.id, replacedAt: now, replacedBy, former: newReadingOf(former) });
  await db
    .update(readings)
    .set(columnsOf(reading))
    .where(and(eq(readings.householdId, householdId), eq(readings.id, reading.id)));
  await db.delete(readingValues).where(eq(readingValues.readingId, reading.id));
  await db.insert(readingValues).values(valueRows(reading));
  return true;
}

/** What a reading was before each correction, oldest first. */
export async function listReadingVersions(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  readingId: string,
) {
  return db
    .select({
      replacedAt: readingVersions.replacedAt,
      replacedBy: readingVersions.replacedBy,
      former: readingVersions.former,
    })
    .from(readingVersions)
    .innerJoin(readings, eq(readings.id, readingVersions.readingId))
    .where(and(eq(readings.householdId, householdId), eq(readings.id, readingId)))
    .orderBy(asc(readingVersions.id));
}

/** Takes a reading out of everything that is computed; it stays in the record. @returns whether it was there */
export async function deleteReading(
  db: DatabaseOrTransaction,
  { householdId, id, now }: { householdId: ProvenHouseholdId; id: string; now: Date },
): Promise<boolean> {
  const deleted = await db
    .update(readings)
    .set({ deletedAt: now })
    .where(and(eq(readings.householdId, householdId), eq(readings.id, id), isNull(readings.deletedAt)))
    .returning({ id: readings.id });
  return deleted.length === 1;
}

async function readWhere(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  condition: SQL | undefined,
  most = 1_000,
): Promise<StoredReading[]> {
  const rows = await db
    .select({ reading: readings, doneByName: doers.name, recordedByName: recorders.name })
    .from(readings)
    .leftJoin(doers, eq(doers.id, readings.doneBy))
    .leftJoin(recorders, eq(recorders.id, readings.recordedBy))
    .where(and(eq(readings.householdId, householdId), isNull(readings.deletedAt), condition))
    .orderBy(desc(readings.takenAt), asc(readings.id))
    .limit(most);
  const values = await valuesOf(
    db,
    rows.map(({ reading }) => reading.id),
  );
  return rows.map(({ reading, doneByName, recordedByName }) => {
    const { householdId: _household, deletedAt: _deleted, ...rest } = reading;
    return { ...rest, doneByName, recordedByName, values: values.get(reading.id) ?? {} };
  });
}

async function valuesOf(db: DatabaseOrTransaction, ids: string[]): Promise<Map<string, Measured>> {
  const found = new Map<string, Measured>();
  if (ids.length === 0) return found;
  for (const row of await db.select().from(readingValues).where(inArray(readingValues.readingId, ids))) {
    const values = found.get(row.readingId) ?? {};
    values[row.quantity] = row.exact ? row.low : { low: row.low, high: row.high };
    found.set(row.readingId, values);
  }
  return found;
}

function columnsOf({ takenAt, kind, method, look, zeroAnswer, note }: NewReading) {
  return { takenAt: new Date(takenAt), kind, method, look, zeroAnswer: zeroAnswer ?? null, note: note ?? null };
}

function valueRows({ id, values }: NewReading): (typeof readingValues.$inferInsert)[] {
  return measuredQuantities.flatMap((quantity) => {
    const value = values[quantity];
    if (value === undefined) return [];
    const { low, high } = typeof value === 'number' ? { low: value, high: value } : value;
    return [{ readingId: id, quantity, low, high, exact: typeof value === 'number' }];
  });
}

function newReadingOf({ id, takenAt, kind, method, values, look, zeroAnswer, note }: StoredReading): NewReading {
  return {
    id,
    takenAt: takenAt.toISOString(),
    kind,
    method,
    values,
    look,
    ...(zeroAnswer === null ? {} : { zeroAnswer }),
    ...(note === null ? {} : { note }),
  };
}
