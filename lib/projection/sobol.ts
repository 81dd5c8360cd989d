/** Degree, coefficients and initial numbers of the primitive polynomials for dimensions 2 to 15. */
const polynomials: readonly (readonly [degree: number, coefficients: number, initial: readonly number[]])[] = [
  [1, 0, [1]],
  [2, 1, [1, 3]],
  [3, 1, [1, 3, 1]],
  [3, 2, [1, 1, 1]],
  [4, 1, [1, 1, 3, 3]],
  [4, 4, [1, 3, 5, 13]],
  [5, 2, [1, 1, 5, 5, 17]],
  [5, 4, [1, 1, 5, 5, 5]],
  [5, 7, [1, 1, 7, 11, 19]],
  [5, 11, [1, 1, 5, 1, 1]],
  [5, 13, [1, 1, 1, 3, 11]],
  [5, 14, [1, 3, 5, 5, 31]],
  [6, 1, [1, 3, 3, 9, 7, 49]],
  [6, 13, [1, 1, 1, 15, 21, 21]],
];

export const SOBOL_DIMENSIONS = polynomials.length + 1;

/**
 * The first `count` points of the Sobol sequence in [0, 1)^dimensions, the origin first, in Gray-code order.
 *
 * @param shifts for each coordinate a whole number from 0 to 2^32 - 1 that its binary digits are added to without carry:
 *   a digital shift keeps the points' even spread and takes them out of the corner of the cube
 * Source: S. Joe, F. Y. Kuo, SIAM J. Sci. Comput. 30 (2008) 2635-2654, direction numbers "new-joe-kuo-6", compared with
 * several public copies of that table. Digital shifts: C. Lemieux, Monte Carlo and Quasi-Monte Carlo Sampling, 2009.
 * Errors: RangeError outside 1..15 dimensions.
 */
export function sobolPoints(count: number, dimensions: number, shifts: readonly number[] = []): number[][] {
  if (!(dimensions >= 1 && dimensions <= SOBOL_DIMENSIONS)) throw new RangeError(`1 to ${SOBOL_DIMENSIONS} dimensions`);
  const directions = Array.from({ length: dimensions }, (_, dimension) => directionNumbers(dimension));
  const state = Uint32Array.from(directions, (_, dimension) => shifts[dimension] ?? 0);
  return Array.from({ length: count }, (_, index) => {
    if (index > 0) {
      const lowestZeroBit = 31 - Math.clz32(~(index - 1) & index);
      for (let dimension = 0; dimension < dimensions; dimension++)
        state[dimension]! ^= directions[dimension]![lowestZeroBit]!;
    }
    return Array.from(state, (digits) => digits / 2 ** 32);
  });
}

function directionNumbers(dimension: number): Uint32Array {
  const numbers = new Uint32Array(32);
  const polynomial = polynomials[dimension - 1];
  for (let bit = 0; bit < 32; bit++) {
    if (!polynomial) {
      numbers[bit] = 2 ** (31 - bit);
      continue;
    }
    const [degree, coefficients, initial] = polynomial;
    if (bit < degree) {
      numbers[bit] = initial[bit]! * 2 ** (31 - bit);
      continue;
    }
    let number = numbers[bit - degree]! ^ (numbers[bit - degree]! >>> degree);
    for (let term = 1; term < degree; term++)
      if ((coefficients >>> (degree - 1 - term)) & 1) number ^= numbers[bit - term]!;
    numbers[bit] = number;
  }
  return numbers;
}
