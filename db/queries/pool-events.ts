import 'server-only';
import { aliasedTable, and, desc, eq, gt, isNull, or } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { people, poolEvents } from '@/db/schema';
import type { PoolEventKind } from '@/lib/schemas/pool-event';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

export type StoredPoolEvent = { id: string; kind: PoolEventKind; happenedAt: Date; reportedBy: string | null };

type NewRow = { householdId: ProvenHouseholdId; personId: string } & Pick<
  typeof poolEvents.$inferInsert,
  'id' | 'kind' | 'happenedAt' | 'createdAt'
>;

/** Writes an event down; false when one of this id is there already, in this household or another. */
export async function insertPoolEvent(tx: Transaction, { personId, ...row }: NewRow): Promise<boolean> {
  const rows = await tx
    .insert(poolEvents)
    .values({ ...row, reportedBy: personId })
    .onConflictDoNothing()
    .returning({ id: poolEvents.id });
  return rows.length > 0;
}

/** Whether an event of this id is this household's. */
export async function hasPoolEvent(
  tx: Transaction,
  { householdId, id }: { householdId: ProvenHouseholdId; id: string },
): Promise<boolean> {
  const rows = await tx
    .select({ id: poolEvents.id })
    .from(poolEvents)
    .where(and(eq(poolEvents.householdId, householdId), eq(poolEvents.id, id)));
  return rows.length > 0;
}

/** What nobody has said to be over: since an instant, and drain covers whenever it was. Newest first. */
export async function listOpenPoolEvents(
  db: DatabaseOrTransaction,
  { householdId, since }: { householdId: ProvenHouseholdId; since: Date },
): Promise<StoredPoolEvent[]> {
  const reporter = aliasedTable(people, 'reporter');
  return db
    .select({
      id: poolEvents.id,
      kind: poolEvents.kind,
      happenedAt: poolEvents.happenedAt,
      reportedBy: reporter.name,
    })
    .from(poolEvents)
    .leftJoin(reporter, eq(reporter.id, poolEvents.reportedBy))
    .where(
      and(
        eq(poolEvents.householdId, householdId),
        isNull(poolEvents.endedAt),
        or(gt(poolEvents.happenedAt, since), eq(poolEvents.kind, 'drain-cover')),
      ),
    )
    .orderBy(desc(poolEvents.happenedAt));
}

/** Says that an event is over; one that was over before stays as it was. */
export async function endPoolEvent(
  tx: Transaction,
  { householdId, id, at, personId }: { householdId: ProvenHouseholdId; id: string; at: Date; personId: string },
): Promise<void> {
  await tx
    .update(poolEvents)
    .set({ endedAt: at, endedBy: personId })
    .where(and(eq(poolEvents.householdId, householdId), eq(poolEvents.id, id), isNull(poolEvents.endedAt)));
}
