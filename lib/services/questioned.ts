import 'server-only';
import type { DatabaseOrTransaction } from '@/db/client';
import { findPosterior } from '@/db/queries/posteriors';
import type { StoredReading } from '@/db/queries/readings';
import { ENGINE_VERSION } from '@/lib/planner/version';
import type { ProvenHouseholdId } from '@/lib/schemas/scope';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import type { ZeroDoubt } from './false-zero';
import { stoodOutOf } from './stood-out';

/**
 * What the newest test says that nobody expected. Chlorine read as none that may be far too much has a question of its own,
 * and what is in the feeder is no test.
 */
export async function questionsOf(
  db: DatabaseOrTransaction,
  householdId: ProvenHouseholdId,
  { newest, zeroDoubt, timeZone }: { newest: StoredReading | null; zeroDoubt: ZeroDoubt; timeZone: string },
): Promise<Pick<WeekSheet, 'questioned' | 'unrecorded'>> {
  const known = newest && (await findPosterior(db, householdId, newest.id));
  if (!newest || known?.engineVersion !== ENGINE_VERSION) return { questioned: [], unrecorded: false };
  const stoodOut = stoodOutOf(known.step.log, newest.takenAt, timeZone);
  return {
    questioned: stoodOut.flatMap(({ kind, quantity, ...found }) => {
      if (kind !== 'questioned' || quantity === 'tabletsLeft') return [];
      return quantity === 'freeChlorine' && zeroDoubt !== null ? [] : [{ quantity, ...found }];
    }),
    unrecorded: stoodOut.some(({ kind }) => kind === 'unrecorded-dose'),
  };
}
