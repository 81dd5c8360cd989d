import { readingError } from '@/lib/projection/reading-error';
import type { UncertainQuantity } from '@/lib/schemas/posterior';
import type { Interval } from '@/lib/schemas/reading';
import type { ReadingMethod } from '@/lib/schemas/reading-kinds';

/** No test is surer than this, one sigma [its unit]: a strip that reads 0 is not exact, nor is an interval of no width. */
export const leastError: Record<UncertainQuantity, number> = {
  freeChlorine: 0.1,
  pH: 0.03,
  totalAlkalinity: 3,
  calciumHardness: 5,
  cyanuricAcid: 3,
};

/**
 * One sigma of a measured value. Where the method's error is a share of the value, it is a share of what was expected: a
 * share of what was read would believe low readings more than high ones, and the wildest most of all.
 *
 * @param expected what the value would be if the model is right; what was read where nothing is expected
 */
export function errorOf(
  quantity: UncertainQuantity,
  value: number | Interval,
  method: ReadingMethod,
  expected: number,
): number {
  const sigma = readingError(quantity, typeof value === 'number' ? Math.max(0, expected) : value, method);
  return Math.max(leastError[quantity], sigma);
}
