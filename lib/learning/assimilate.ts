import type { LearningNote, UncertainQuantity } from '@/lib/schemas/posterior';
import type { FilterState } from '@/lib/schemas/posterior';
import { hampelWeight, QUESTIONED_BELOW } from './hampel';
import { parameterPlaces, placeOf, waterPlaces } from './state';

/** Of the standard normal distribution. */
export const QUANTILE_90 = 1.2815515655446004;
/** Where a believed surprise comes to lie, in sigmas of what is expected after the expectation was loosened. */
export const BELIEVED_AT = 1.5;

/** No pool spares more of the loss that is expected of it: what is there beyond that was added. */
export const MOST_OF_LOSS_SPARED = 0.7;

/** The band that a value was expected in [its unit]; nothing measured is below 0. */
export function expectedBand(middle: number, sigma: number) {
  return { p10: Math.max(0, middle - QUANTILE_90 * sigma), p50: middle, p90: middle + QUANTILE_90 * sigma };
}

/**
 * Takes one measured value into what is known: the scalar update of the Kalman filter,
 *
 *     S = P_kk + R,  x <- x + w P_k (y - x_k) / S,  P <- P - w P_k P_k' / S
 *
 * with the weight w of the surprise, so that one wild value moves nothing. A second one that lies the same way is
 * believed: then the expectation was wrong, and before the update it is loosened until the value is no surprise (fading
 * memory). Changes `state`.
 *
 * @param chlorineLoss free chlorine expected to be used up since the last reading [mg/L]
 * Source: R. E. Kalman 1960; weight: see {@link hampelWeight}; loosening as in adaptive fading filters (Q. Xia, M. Rao,
 * Y. Ying, X. Shen, Automatica 30 (1994) 1333-1338; from memory).
 */
export function assimilate(
  state: FilterState,
  quantity: UncertainQuantity,
  measured: number,
  sigma: number,
  chlorineLoss: number,
): LearningNote {
  const { mean, covariance, doubts } = state;
  const place = placeOf[quantity];
  const surprise = measured - mean[place]!;
  const total = Math.sqrt(covariance[place]![place]! + sigma ** 2);
  const weight = hampelWeight(surprise / total);
  const questioned = weight < QUESTIONED_BELOW;
  const side = surprise > 0 ? 1 : -1;
  const believed = questioned && doubts[quantity] === side;
  const note = { quantity, measured, expected: expectedBand(mean[place]!, total) };
  if (questioned && !believed) doubts[quantity] = side;
  else delete doubts[quantity];

  // To learn from chlorine that somebody added unseen that hardly any is used up would starve the water.
  const unrecorded = believed && quantity === 'freeChlorine' && surprise > MOST_OF_LOSS_SPARED * chlorineLoss;
  if (unrecorded) loosenAlone(state, quantity, surprise, sigma);
  else if (believed) loosen(state, quantity, surprise, sigma);
  update(mean, covariance, place, surprise, sigma, believed ? 1 : weight);
  if (believed) return { ...note, kind: unrecorded ? 'unrecorded-dose' : 'believed', weight: 1 };
  return { ...note, kind: questioned ? 'questioned' : 'counted', weight };
}

/**
 * Takes a measured value for what it is and lets it teach no parameter: what is known of the water no longer hangs together
 * with what is known of the pool, and is widened until the value is no surprise. Changes `state`.
 */
export function takeAsRead(state: FilterState, quantity: UncertainQuantity, measured: number, sigma: number): void {
  const { mean, covariance, doubts } = state;
  const place = placeOf[quantity];
  const surprise = measured - mean[place]!;
  for (const water of waterPlaces)
    for (const parameter of parameterPlaces) covariance[water]![parameter] = covariance[parameter]![water] = 0;
  delete doubts[quantity];
  loosenAlone(state, quantity, surprise, sigma);
  update(mean, covariance, place, surprise, sigma, 1);
}

/** Changes mean and covariance by a value at one place. */
function update(
  mean: number[],
  covariance: number[][],
  place: number,
  surprise: number,
  sigma: number,
  weight: number,
): void {
  if (weight === 0) return;
  const along = [...covariance[place]!];
  const share = weight / (along[place]! + sigma ** 2);
  for (let row = 0; row < mean.length; row++) {
    mean[row]! += share * along[row]! * surprise;
    for (let column = 0; column < mean.length; column++)
      covariance[row]![column]! -= share * (along[row]! * along[column]!);
  }
}

/** Variance of a quantity at which a value is no surprise any more. */
function varianceWanted(surprise: number, sigma: number): number {
  return Math.max(0, (surprise / BELIEVED_AT) ** 2 - sigma ** 2);
}

/** Widens what is known of a quantity for a reason that no parameter has to do with: its own variance only. */
function loosenAlone({ covariance }: FilterState, quantity: UncertainQuantity, surprise: number, sigma: number): void {
  const place = placeOf[quantity];
  const variance = covariance[place]![place]!;
  covariance[place]![place] = Math.max(variance, varianceWanted(surprise, sigma));
}

/**
 * Widens what is known of a quantity, and for what sun and demand change day by day the parameters too, none beyond its
 * prior. Rows and columns grow by the same factors, so it stays a covariance.
 */
function loosen({ covariance }: FilterState, quantity: UncertainQuantity, surprise: number, sigma: number): void {
  const place = placeOf[quantity];
  const factor = Math.sqrt(Math.max(1, varianceWanted(surprise, sigma) / covariance[place]![place]!));
  const factors = covariance.map(() => 1);
  factors[place] = factor;
  if (quantity === 'freeChlorine' || quantity === 'pH')
    for (const parameter of parameterPlaces)
      factors[parameter] = Math.min(factor, Math.max(1, 1 / Math.sqrt(covariance[parameter]![parameter]!)));
  for (let row = 0; row < factors.length; row++)
    for (let column = 0; column < factors.length; column++)
      covariance[row]![column]! *= factors[row]! * factors[column]!;
}
