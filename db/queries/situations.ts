import 'server-only';
import { aliasedTable, and, desc, eq, inArray, isNotNull, isNull, ne, or } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { people, situations, situationTicks } from '@/db/schema';
import type { Situation, SituationEnding, SituationKind } from '@/lib/schemas/situation';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type StoredSituation = {
  id: string;
  kind: SituationKind;
  answers: Situation['answers'];
  openedAt: Date;
  openedBy: string | null;
  endedAt: Date | null;
  endedBy: string | null;
  ending: SituationEnding | null;
};

const openers = aliasedTable(people, 'openers');
const enders = aliasedTable(people, 'enders');

function readSituations(db: DatabaseOrTransaction) {
  return db
    .select({
      id: situations.id,
      kind: situations.kind,
      answers: situations.answers,
      openedAt: situations.openedAt,
      openedBy: openers.name,
      endedAt: situations.endedAt,
      endedBy: enders.name,
      ending: situations.ending,
    })
    .from(situations)
    .leftJoin(openers, eq(openers.id, situations.openedBy))
    .leftJoin(enders, eq(enders.id, situations.endedBy));
}

/** The one that is open; null when none is. */
export async function findOpenSituation(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
): Promise<StoredSituation | null> {
  const [found] = await readSituations(db).where(
    and(eq(situations.householdId, householdId), isNull(situations.endedAt)),
  );
  return found ?? null;
}

export async function findSituation(
  db: DatabaseOrTransaction,
  { householdId, id }: { householdId: ProvenHouseholdId; id: string },
): Promise<StoredSituation | null> {
  const [found] = await readSituations(db).where(and(eq(situations.householdId, householdId), eq(situations.id, id)));
  return found ?? null;
}

/** Those that are over, the newest first. */
export async function listEndedSituations(
  db: DatabaseOrTransaction,
  { householdId, most }: { householdId: ProvenHouseholdId; most: number },
): Promise<StoredSituation[]> {
  return readSituations(db)
    .where(and(eq(situations.householdId, householdId), isNotNull(situations.endedAt)))
    .orderBy(desc(situations.endedAt))
    .limit(most);
}

/** Kinds in which something in the water uses up more chlorine than the pool itself. */
const treated: SituationKind[] = ['clearing', 'combined-chlorine', 'accident'];

/** From when until when such a procedure was open [ms]; without an end while it is. One begun by mistake does not count. */
export async function listTreatedTimes(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
): Promise<{ from: number; until: number }[]> {
  const rows = await db
    .select({ openedAt: situations.openedAt, endedAt: situations.endedAt })
    .from(situations)
    .where(
      and(
        eq(situations.householdId, householdId),
        inArray(situations.kind, treated),
        or(isNull(situations.ending), ne(situations.ending, 'mistake')),
      ),
    );
  return rows.map(({ openedAt, endedAt }) => ({ from: openedAt.getTime(), until: endedAt?.getTime() ?? Infinity }));
}

type NewRow = { householdId: ProvenHouseholdId; personId: string } & Pick<
  typeof situations.$inferInsert,
  'id' | 'kind' | 'answers' | 'openedAt'
>;

/** Begins one; false when one of this id is there already, in this household or another. */
export async function insertSituation(tx: Transaction, { personId, ...row }: NewRow): Promise<boolean> {
  const rows = await tx
    .insert(situations)
    .values({ ...row, openedBy: personId })
    .onConflictDoNothing({ target: situations.id })
    .returning({ id: situations.id });
  return rows.length > 0;
}

export async function replaceAnswers(
  tx: Transaction,
  { householdId, id, answers }: { householdId: ProvenHouseholdId; id: string; answers: Situation['answers'] },
): Promise<void> {
  await tx
    .update(situations)
    .set({ answers })
    .where(and(eq(situations.householdId, householdId), eq(situations.id, id)));
}

export async function endSituation(
  tx: Transaction,
  row: { householdId: ProvenHouseholdId; id: string; personId: string; at: Date; ending: SituationEnding },
): Promise<void> {
  await tx
    .update(situations)
    .set({ endedAt: row.at, endedBy: row.personId, ending: row.ending })
    .where(and(eq(situations.householdId, row.householdId), eq(situations.id, row.id), isNull(situations.endedAt)));
}

export type StoredTick = { step: string; doneAt: Date; doneBy: string | null };

export async function listSituationTicks(
  db: DatabaseOrTransaction,
  { householdId, situationId }: { householdId: ProvenHouseholdId; situationId: string },
): Promise<StoredTick[]> {
  return db
    .select({ step: situationTicks.step, doneAt: situationTicks.doneAt, doneBy: people.name })
    .from(situationTicks)
    .leftJoin(people, eq(people.id, situationTicks.doneBy))
    .where(and(eq(situationTicks.householdId, householdId), eq(situationTicks.situationId, situationId)));
}

/** Ticks a step; one that was ticked before keeps who did it and when. */
export async function insertSituationTick(
  tx: Transaction,
  row: { householdId: ProvenHouseholdId; situationId: string; step: string; doneAt: Date; doneBy: string },
): Promise<void> {
  await tx.insert(situationTicks).values(row).onConflictDoNothing();
}

export async function deleteSituationTick(
  tx: Transaction,
  { householdId, situationId, step }: { householdId: ProvenHouseholdId; situationId: string; step: string },
): Promise<void> {
  await tx
    .delete(situationTicks)
    .where(
      and(
        eq(situationTicks.householdId, householdId),
        eq(situationTicks.situationId, situationId),
        eq(situationTicks.step, step),
      ),
    );
}
