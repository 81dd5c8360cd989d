const a = [
  -39.69683028665376, 220.9460984245205, -275.9285104469687, 138.357751867269, -30.66479806614716, 2.506628277459239,
];
const b = [-54.47609879822406, 161.5858368580409, -155.6989798598866, 66.80131188771972, -13.28068155288572];
const c = [
  -0.007784894002430293, -0.3223964580411365, -2.400758277161838, -2.549732539343734, 4.374664141464968,
  2.938163982698783,
];
const d = [0.007784695709041462, 0.3224671290700398, 2.445134137142996, 3.754408661907416];

const polynomial = (coefficients: readonly number[], x: number) =>
  coefficients.reduce((sum, each) => sum * x + each, 0);

/**
 * Quantile of the standard normal distribution.
 *
 * @param share probability, above 0 and below 1
 * Uncertainty: relative error under 1.15e-9.
 * Source: P. J. Acklam's rational approximation (coefficients from memory, checked against published quantiles).
 */
export function normalQuantile(share: number): number {
  if (share > 0.97575) return -normalQuantile(1 - share);
  if (share < 0.02425) {
    const q = Math.sqrt(-2 * Math.log(share));
    return polynomial(c, q) / (polynomial(d, q) * q + 1);
  }
  const q = share - 0.5;
  const r = q * q;
  return (polynomial(a, r) * q) / (polynomial(b, r) * r + 1);
}
