import { describe, expect, it } from 'vitest';
import { choleskyFactor } from '@/lib/projection/cholesky';

describe("Cholesky's factor", () => {
  // Worked example of many textbooks.
  const matrix = [
    [4, 12, -16],
    [12, 37, -43],
    [-16, -43, 98],
  ];

  it('is that of the textbook', () => {
    expect(choleskyFactor(matrix).map((row) => Array.from(row))).toEqual([
      [2, 0, 0],
      [6, 1, 0],
      [-8, 5, 3],
    ]);
  });

  it('takes a pivot that rounding brought to 0 and refuses one that is clearly negative', () => {
    const [, row] = choleskyFactor([
      [1, 1],
      [1, 1],
    ]);
    expect(row![1]!).toBeGreaterThan(0);
    expect(row![1]!).toBeLessThan(1e-5);
    for (const second of [0.9, Number.NaN])
      expect(() =>
        choleskyFactor([
          [1, 1],
          [1, second],
        ]),
      ).toThrow(RangeError);
  });
});
