/** What is added to a diagonal that rounding has brought to 0 or under, as a share of its size. */
const LEAST_SHARE = 1e-12;

/**
 * Lower triangular L with L L' = C, row by row, for a symmetric matrix that is positive definite but for rounding.
 *
 * @param covariance square, rows of numbers
 * Errors: RangeError when a pivot is clearly negative or not finite.
 * Source: Golub and Van Loan, Matrix Computations, 4th edition 2013, algorithm 4.2.1.
 */
export function choleskyFactor(covariance: readonly (readonly number[])[]): Float64Array[] {
  const factor = covariance.map((row) => new Float64Array(row.length));
  for (let row = 0; row < factor.length; row++) {
    const current = factor[row]!;
    for (let column = 0; column < row; column++) {
      const other = factor[column]!;
      let sum = covariance[row]![column]!;
      for (let term = 0; term < column; term++) sum -= current[term]! * other[term]!;
      current[column] = sum / other[column]!;
    }
    const size = covariance[row]![row]!;
    let pivot = size;
    for (let term = 0; term < row; term++) pivot -= current[term]! ** 2;
    if (!(pivot > -1e-6 * size)) throw new RangeError(`Row ${row} of a covariance leaves ${pivot} of ${size}.`);
    current[row] = Math.sqrt(Math.max(pivot, LEAST_SHARE * size));
  }
  return factor;
}
