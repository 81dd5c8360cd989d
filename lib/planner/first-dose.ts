import type { Scenario } from '@/lib/schemas/scenario';
import { type Draft, keyOf } from './draft';

/**
 * Halves the first dose of a pool whose volume was only estimated and into which nothing has gone yet: half, then test
 * again. A single measure or tablet stays: it cannot be halved.
 */
export function halveFirstDose(
  draft: Draft,
  { pool, given }: Scenario,
): { draft: Draft; halvedEvening: number | null } {
  const whole = { draft, halvedEvening: null };
  if (!pool.volumeEstimated || given.length > 0) return whole;
  const first = draft.measures.findIndex((measures, evening) => measures > 0 || draft.tablets[evening]! > 0);
  const half = (counts: readonly number[]) =>
    counts.map((count, evening) => (evening === first && count > 1 ? Math.floor(count / 2) : count));
  const halved = { ...draft, tablets: half(draft.tablets), measures: half(draft.measures) };
  return keyOf(halved) === keyOf(draft) ? whole : { draft: halved, halvedEvening: first };
}
