/** Where doubt begins, where it is no longer held back, and where nothing counts, in sigmas of what was expected. */
export const DOUBT = 2.5;
export const STRONG_DOUBT = 3;
export const NO_BELIEF = 5;

/** A value that counts for less than this is questioned. */
export const QUESTIONED_BELOW = 0.8;

/**
 * Weight of a value that lies `distance` sigmas from what was expected: Hampel's three-part function,
 *
 *     1  up to a;  a / r  up to b;  a (c - r) / (r (c - b))  up to c;  0 beyond
 *
 * with a = 2.5, b = 3 and c = 5: of 1,000 honest values a dozen lose some of their weight and three are questioned.
 *
 * Source: F. R. Hampel, J. Am. Stat. Assoc. 69 (1974) 383-393 (form as in statsmodels' documentation; constants ours).
 */
export function hampelWeight(distance: number): number {
  const r = Math.abs(distance);
  if (r <= DOUBT) return 1;
  if (r <= STRONG_DOUBT) return DOUBT / r;
  if (r < NO_BELIEF) return (DOUBT * (NO_BELIEF - r)) / (r * (NO_BELIEF - STRONG_DOUBT));
  return 0;
}
