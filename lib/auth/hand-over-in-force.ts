import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { listHandOvers } from '@/db/queries/hand-overs';
import { addDays, dayOf, stretchOfDays } from '@/lib/calendar/household-day';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';

type HouseholdNow = { householdId: ProvenHouseholdId; timeZone: string; now: Date };

/** A hand-over that is not over, with the instants of its days: `from` belongs to it, `until` does not [ms]. */
export type HandOverAhead = Awaited<ReturnType<typeof listHandOvers>>[number] & {
  from: number;
  until: number;
  /** Agreed to, and its time is now. */
  inForce: boolean;
};

/** The hand-overs of a household that are not over, the earliest first. No two of them overlap. */
export async function listHandOversAhead(
  db: DatabaseOrTransaction,
  { householdId, timeZone, now }: HouseholdNow,
): Promise<HandOverAhead[]> {
  const instant = now.getTime();
  // Which day it is can go back by one where clocks are set back just after midnight; the instants below decide.
  const since = addDays(dayOf(instant, timeZone), -1);
  const rows = await listHandOvers(db, { householdId, since, now });
  return rows
    .map((row) => {
      const { from, until } = stretchOfDays(row.fromDay, row.untilDay, timeZone);
      return { ...row, from, until, inForce: row.agreedAt !== null && from <= instant && instant < until };
    })
    .filter(({ until }) => instant < until);
}

/** Who looks after the pool alone at this instant; undefined when nobody stands in. */
export async function findHandOverInForce(
  db: DatabaseOrTransaction,
  household: HouseholdNow,
): Promise<HandOverAhead | undefined> {
  return (await listHandOversAhead(db, household)).find(({ inForce }) => inForce);
}
