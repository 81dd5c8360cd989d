import type { Scenario } from '@/lib/schemas/scenario';
import type { Draft } from './draft';

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
  const fastEvening = draft.measures.findIndex((measures) => measures > 0);
  const tabletsFirst = draft.tablets > 0 && (fastEvening < 0 || draft.tabletEvening < fastEvening);
  const half = (count: number) => Math.max(1, Math.floor(count / 2));
  if (tabletsFirst)
    return draft.tablets === 1
      ? whole
      : { draft: { ...draft, tablets: half(draft.tablets) }, halvedEvening: draft.tabletEvening };
  if (fastEvening < 0 || draft.measures[fastEvening] === 1) return whole;
  const measures = draft.measures.map((each, evening) => (evening === fastEvening ? half(each) : each));
  return { draft: { ...draft, measures }, halvedEvening: fastEvening };
}
