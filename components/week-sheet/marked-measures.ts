import type { PlanDose } from '@/lib/schemas/plan-dose';

/** How often a measure is filled: whole, in quarters, or to one decimal. */
export type MarkedMeasures =
  | { how: 'whole'; count: number }
  | { how: 'quarters'; whole: number; quarters: 1 | 2 | 3 }
  | { how: 'decimal'; count: number };

/** Nobody sees less than this on a measure [share of the dose]. */
const UNSEEN = 0.01;
/** Where one decimal is further off than this, the weight is said alone [share of the dose]. */
const FURTHEST_OFF = 0.05;

/**
 * A dose in the marked measure that the household keeps for its product. Undefined where it keeps none, for tablets, and
 * where a measure cannot be filled so finely.
 */
export function markedMeasures({
  amount,
  unit,
  measure,
}: Pick<PlanDose, 'amount' | 'unit' | 'measure'>): MarkedMeasures | undefined {
  if (measure === null || unit === 'tablet') return undefined;
  const count = amount / measure;
  const off = (said: number) => Math.abs(said - count) / count;
  if (off(Math.round(count)) <= UNSEEN) return { how: 'whole', count: Math.round(count) };
  const inQuarters = Math.round(count * 4);
  const quarters = inQuarters % 4;
  if (off(inQuarters / 4) <= UNSEEN && (quarters === 1 || quarters === 2 || quarters === 3))
    return { how: 'quarters', whole: Math.floor(inQuarters / 4), quarters };
  const tenths = Math.round(count * 10) / 10;
  return off(tenths) <= FURTHEST_OFF ? { how: 'decimal', count: tenths } : undefined;
}
