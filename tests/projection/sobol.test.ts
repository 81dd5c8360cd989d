import { describe, expect, it } from 'vitest';
import { SOBOL_DIMENSIONS, sobolPoints } from '@/lib/projection/sobol';

describe('sobolPoints', () => {
  it('gives the published unscrambled sequence', () => {
    // Joe and Kuo 2010, as scipy.stats.qmc.Sobol(2, scramble=False) is tested against it.
    expect(sobolPoints(8, 2)).toEqual([
      [0, 0],
      [0.5, 0.5],
      [0.75, 0.25],
      [0.25, 0.75],
      [0.375, 0.375],
      [0.875, 0.875],
      [0.625, 0.125],
      [0.125, 0.625],
    ]);
  });

  const shifts = Array.from({ length: SOBOL_DIMENSIONS }, (_, dimension) => (dimension * 0x1234567 + 0x89abcdef) >>> 0);

  it.each([
    [32, []],
    [64, []],
    [64, shifts],
  ])('puts one of %i points into each of as many equal parts of every coordinate', (count, shift) => {
    const points = sobolPoints(count, SOBOL_DIMENSIONS, shift);
    for (let dimension = 0; dimension < SOBOL_DIMENSIONS; dimension++) {
      const parts = points.map((point) => Math.floor(point[dimension]! * count)).sort((a, b) => a - b);
      expect(parts).toEqual(Array.from({ length: count }, (_, part) => part));
    }
  });

  it('spreads no two coordinates alike', () => {
    const points = sobolPoints(64, SOBOL_DIMENSIONS);
    for (let one = 0; one < SOBOL_DIMENSIONS; one++)
      for (let other = 0; other < one; other++) expect(points.some((point) => point[one] !== point[other])).toBe(true);
  });

  it('refuses more dimensions than it has numbers for', () => {
    expect(() => sobolPoints(4, SOBOL_DIMENSIONS + 1)).toThrow(RangeError);
    expect(() => sobolPoints(4, 0)).toThrow(RangeError);
  });
});
