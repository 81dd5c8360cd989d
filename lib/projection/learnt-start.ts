import { parseInstant } from '@/lib/calendar/wall-time';
import { jointOrder, type Posterior, uncertainQuantities } from '@/lib/schemas/posterior';
import type { ReadingErrors } from './reading-error';

/**
 * The water that a posterior's courses start from, in the form of a reading's: by everything read and dosed so far. On
 * simulated pools the week after is foretold with a fifth less error than from the bare test (tests/learning).
 *
 * @returns instant [ms]; mg/L, pH; one sigma of each quantity for what takes no joint covariance
 */
export function learntStart({ readingAt, water, covariance, loads }: Posterior) {
  const errors = Object.fromEntries(
    uncertainQuantities.map((quantity) => {
      const place = jointOrder.indexOf(quantity);
      return [quantity, Math.sqrt(covariance[place]![place]!)];
    }),
  ) as ReadingErrors;
  return { takenAt: parseInstant(readingAt)!, water, errors, loads };
}
