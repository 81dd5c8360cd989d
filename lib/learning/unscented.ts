import { choleskyFactor } from '@/lib/projection/cholesky';

/**
 * Square of the sigma points' distance from the mean, in sigmas: alpha^2 (n + kappa) of the scaled transform. 3 is right
 * to the fourth moment of a normal distribution along each axis (Julier and Uhlmann 1997).
 */
const DISTANCE_SQUARED = 3;

/** A point of the joint space with its weight in means. */
export type SigmaPoint = { at: Float64Array; weight: number };

/**
 * Sigma points of a normal distribution: the mean, and two along each column of the covariance's Cholesky factor.
 *
 *     x0 = m,  x(i) = m +- sqrt(3) L e(i),  weights 1 - n / 3 and 1 / 6
 *
 * Among a dozen dimensions the middle point's weight is negative; {@link momentsOf} therefore takes covariances about what
 * became of that point, which keeps them covariances whatever the function does (the modified form of 1997).
 *
 * Source: S. J. Julier, J. K. Uhlmann, Proc. SPIE 3068 (1997) 182-193; scaled form: E. A. Wan, R. van der Merwe, IEEE
 * AS-SPCC 2000, 153-158 (formulas from memory).
 */
export function sigmaPoints(mean: readonly number[], covariance: readonly (readonly number[])[]): SigmaPoint[] {
  const size = mean.length;
  const factor = choleskyFactor(covariance);
  const distance = Math.sqrt(DISTANCE_SQUARED);
  const weight = 1 / (2 * DISTANCE_SQUARED);
  const points: SigmaPoint[] = [{ at: Float64Array.from(mean), weight: 1 - size / DISTANCE_SQUARED }];
  for (let column = 0; column < size; column++)
    for (const side of [distance, -distance])
      points.push({ at: Float64Array.from(mean, (value, row) => value + side * factor[row]![column]!), weight });
  return points;
}

/** Mean of points after a function has moved them, and covariance about where the first of them, the middle one, went. */
export function momentsOf(points: readonly SigmaPoint[]): { mean: number[]; covariance: number[][] } {
  const middle = points[0]!.at;
  const size = middle.length;
  const mean = new Array<number>(size).fill(0);
  for (const { at, weight } of points) for (let row = 0; row < size; row++) mean[row]! += weight * at[row]!;
  const covariance = mean.map(() => new Array<number>(size).fill(0));
  for (const { at, weight } of points.slice(1))
    for (let row = 0; row < size; row++)
      for (let column = 0; column <= row; column++)
        covariance[row]![column]! += weight * (at[row]! - middle[row]!) * (at[column]! - middle[column]!);
  for (let row = 0; row < size; row++)
    for (let column = 0; column < row; column++) covariance[column]![row] = covariance[row]![column]!;
  return { mean, covariance };
}
