import { dayOf } from '@/lib/calendar/household-day';
import { parseInstant } from '@/lib/calendar/wall-time';
import type { PlanDose } from '@/lib/schemas/plan-dose';

/** One visit of the plan before and after a test: null where there is none. */
export type PlanChange = { before: PlanDose | null; after: PlanDose | null; at: number };

/**
 * What a test changed in the plan: the doses still to come, product by product and day by day. Amounts that differ by less
 * than a whole gram or millilitre are the same.
 */
export function planChanges(
  before: readonly PlanDose[],
  after: readonly PlanDose[],
  now: number,
  timeZone: string,
): { changed: PlanChange[]; kept: number } {
  const pairs = new Map<string, PlanChange>();
  const put = (doses: readonly PlanDose[], side: 'before' | 'after') => {
    for (const dose of doses) {
      const at = parseInstant(dose.at) ?? Number.NaN;
      if (dose.status !== 'planned' || !(at > now)) continue;
      const key = `${dayOf(at, timeZone)} ${dose.substance} ${dose.form}`;
      pairs.set(key, { before: null, after: null, ...pairs.get(key), [side]: dose, at });
    }
  };
  put(before, 'before');
  put(after, 'after');
  const all = [...pairs.values()].sort((a, b) => a.at - b.at);
  const changed = all.filter((change) => !isSame(change));
  return { changed, kept: all.length - changed.length };
}

function isSame({ before, after }: PlanChange): boolean {
  return before !== null && after !== null && Math.abs(before.amount - after.amount) < 1;
}
