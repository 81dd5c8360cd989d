import 'server-only';
import { and, asc, eq, inArray, notInArray, sql } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { posteriors } from '@/db/schema';
import type { LearningNote, PosteriorStep } from '@/lib/schemas/posterior';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type NewPosterior = Omit<typeof posteriors.$inferInsert, 'householdId'>;

/** Which readings have a posterior, and what each was made from. */
export async function listPosteriorHashes(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
): Promise<Map<string, string>> {
  const rows = await db
    .select({ readingId: posteriors.readingId, inputHash: posteriors.inputHash })
    .from(posteriors)
    .where(eq(posteriors.householdId, householdId))
    .orderBy(asc(posteriors.takenAt));
  return new Map(rows.map(({ readingId, inputHash }) => [readingId, inputHash]));
}

/** What the pool had taught by a reading; null while that has not been worked out. */
export async function findPosterior(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  readingId: string,
): Promise<{ step: PosteriorStep; engineVersion: string } | null> {
  const [row] = await db
    .select({ step: posteriors.step, engineVersion: posteriors.engineVersion })
    .from(posteriors)
    .where(and(eq(posteriors.householdId, householdId), eq(posteriors.readingId, readingId)));
  return row ?? null;
}

/** What became of each reading that an engine of this version learnt from, oldest first. */
export async function listLearningLogs(
  db: DatabaseOrTransaction,
  { householdId, engineVersion }: { householdId: ProvenHouseholdId; engineVersion: string },
): Promise<{ takenAt: Date; log: LearningNote[] }[]> {
  const rows = await db
    .select({ takenAt: posteriors.takenAt, log: sql<string>`json_extract(${posteriors.step}, '$.log')` })
    .from(posteriors)
    .where(and(eq(posteriors.householdId, householdId), eq(posteriors.engineVersion, engineVersion)))
    .orderBy(asc(posteriors.takenAt), asc(posteriors.readingId));
  return rows.map(({ takenAt, log }) => ({ takenAt, log: JSON.parse(log) as LearningNote[] }));
}

/** Puts newly learnt steps in the place of the old ones; those of readings that no longer count go. */
export async function replacePosteriors(
  tx: Transaction,
  {
    householdId,
    readingIds,
    learnt,
  }: { householdId: ProvenHouseholdId; readingIds: readonly string[]; learnt: readonly NewPosterior[] },
): Promise<void> {
  const mine = eq(posteriors.householdId, householdId);
  const ids = learnt.map(({ readingId }) => readingId);
  await tx.delete(posteriors).where(and(mine, notInArray(posteriors.readingId, [...readingIds])));
  await tx.delete(posteriors).where(and(mine, inArray(posteriors.readingId, ids)));
  if (learnt.length > 0) await tx.insert(posteriors).values(learnt.map((row) => ({ ...row, householdId })));
}
