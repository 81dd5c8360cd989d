import { type UncertainQuantity, uncertainQuantities } from '@/lib/schemas/posterior';
import type { Interval } from '@/lib/schemas/reading';
import type { ReadingMethod } from '@/lib/schemas/reading-kinds';

export { type UncertainQuantity, uncertainQuantities };

type MethodError = { relative: number } | { absolute: number };

/** One sigma of a value by method. Assumptions; what is published on kits and strips lies in the same range. */
export const methodError: Record<UncertainQuantity, Record<ReadingMethod, MethodError>> = {
  freeChlorine: { strip: { relative: 0.3 }, 'drop-kit': { relative: 0.1 }, slip: { relative: 0.1 } },
  pH: { strip: { absolute: 0.2 }, 'drop-kit': { absolute: 0.1 }, slip: { absolute: 0.1 } },
  totalAlkalinity: { strip: { absolute: 20 }, 'drop-kit': { absolute: 10 }, slip: { absolute: 10 } },
  calciumHardness: { strip: { relative: 0.2 }, 'drop-kit': { absolute: 10 }, slip: { absolute: 10 } },
  cyanuricAcid: { strip: { relative: 0.25 }, 'drop-kit': { absolute: 15 }, slip: { absolute: 10 } },
};

export const LEAST_FREE_CHLORINE_ERROR = 0.2;
export const WIDTHS_OF_INTERVAL = 3.5;

/** What a value becomes less certain by in a day of being carried forward [its unit]; practice. */
export const growthPerDay: Record<UncertainQuantity, number> = {
  freeChlorine: 0.3,
  pH: 0.03,
  totalAlkalinity: 1,
  calciumHardness: 1,
  cyanuricAcid: 0.7,
};

/** The middle of what was read: an interval counts as its midpoint. */
export function middleOf(value: number | Interval): number {
  return typeof value === 'number' ? value : (value.low + value.high) / 2;
}

/**
 * One sigma of a measured value: an interval's width / 3.5, else the method's error; free chlorine at least 0.2 mg/L.
 *
 * @param value as read: mg/L, or pH
 */
export function readingError(quantity: UncertainQuantity, value: number | Interval, method: ReadingMethod): number {
  if (typeof value !== 'number') return (value.high - value.low) / WIDTHS_OF_INTERVAL;
  const error = methodError[quantity][method];
  const sigma = 'relative' in error ? error.relative * value : error.absolute;
  return quantity === 'freeChlorine' ? Math.max(LEAST_FREE_CHLORINE_ERROR, sigma) : sigma;
}

/** Sigma after `days` of being carried forward: independent errors add in squares. */
export function carriedError(quantity: UncertainQuantity, sigma: number, days: number): number {
  return Math.hypot(sigma, growthPerDay[quantity] * days);
}

export type ReadingErrors = Record<UncertainQuantity, number>;
