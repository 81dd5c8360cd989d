import 'server-only';
import { and, eq, gt } from 'drizzle-orm';
import type { DatabaseOrTransaction, Transaction } from '@/db/client';
import { stopConfirmations } from '@/db/schema';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

type NewRow = Omit<typeof stopConfirmations.$inferInsert, 'householdId'> & { householdId: ProvenHouseholdId };
type Asker = { householdId: ProvenHouseholdId; personId: string };

/** Writes a confirmation down; false when one of this id is there already, whosever it is. */
export async function insertStopConfirmation(tx: Transaction, row: NewRow): Promise<boolean> {
  const written = await tx
    .insert(stopConfirmations)
    .values(row)
    .onConflictDoNothing()
    .returning({ id: stopConfirmations.id });
  return written.length > 0;
}

/** Whether a confirmation of this id is this person's, in this household. */
export async function hasStopConfirmation(
  tx: Transaction,
  { householdId, personId, id }: Asker & { id: string },
): Promise<boolean> {
  const found = await tx
    .select({ id: stopConfirmations.id })
    .from(stopConfirmations)
    .where(
      and(
        eq(stopConfirmations.householdId, householdId),
        eq(stopConfirmations.personId, personId),
        eq(stopConfirmations.id, id),
      ),
    );
  return found.length > 0;
}

/** The products whose Stop this person has confirmed after an instant, as they were then. */
export async function listConfirmedStops(
  db: DatabaseOrTransaction,
  { householdId, personId, since }: Asker & { since: Date },
): Promise<ReadonlySet<string>> {
  const found = await db
    .selectDistinct({ product: stopConfirmations.product })
    .from(stopConfirmations)
    .where(
      and(
        eq(stopConfirmations.householdId, householdId),
        eq(stopConfirmations.personId, personId),
        gt(stopConfirmations.confirmedAt, since),
      ),
    );
  return new Set(found.map(({ product }) => product));
}
