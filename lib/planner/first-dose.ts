import type { Scenario } from '@/lib/schemas/scenario';
import type { Draft } from './draft';

/**
 * Halves the first dose of a pool whose volume was only estimated and into which nothing has gone yet: half, then test
 * again. At least one measure or tablet stays.
 */
export function halveFirstDose(
  draft: Draft,
  { pool, given }: Scenario,
): { draft: Draft; halvedEvening: number | null } {
  if (!pool.volumeEstimated || given.length > 0) return { draft, halvedEvening: null };
  const fastEvening = draft.measures.findIndex((measures) => measures > 0);
  const tabletsFirst = draft.tablets > 0 && (fastEvening < 0 || draft.tabletEvening < fastEvening);
  const half = (count: number) => Math.max(1, Math.floor(count / 2));
  if (tabletsFirst) return { draft: { ...draft, tablets: half(draft.tablets) }, halvedEvening: draft.tabletEvening };
  if (fastEvening < 0) return { draft, halvedEvening: null };
  const measures = draft.measures.map((each, evening) => (evening === fastEvening ? half(each) : each));
  return { draft: { ...draft, measures }, halvedEvening: fastEvening };
}
