import { describe, expect, it } from 'vitest';
import { hampelWeight } from '@/lib/learning/hampel';
import { momentsOf, sigmaPoints } from '@/lib/learning/unscented';

const mean = [1, -2, 0.5];
const covariance = [
  [4, 1, -0.5],
  [1, 2, 0.3],
  [-0.5, 0.3, 1],
];

/** The same points after a function of their coordinates. */
function moved(change: (at: Float64Array) => number[]) {
  return sigmaPoints(mean, covariance).map(({ at, weight }) => ({ at: Float64Array.from(change(at)), weight }));
}

describe('the unscented transform', () => {
  it('keeps mean and covariance of what is not changed', () => {
    const found = momentsOf(sigmaPoints(mean, covariance));
    found.mean.forEach((value, row) => expect(value).toBeCloseTo(mean[row]!, 12));
    found.covariance.flat().forEach((value, index) => expect(value).toBeCloseTo(covariance.flat()[index]!, 12));
  });

  it('is exact for a linear function: A m + b, A C A transposed', () => {
    const found = momentsOf(moved(([x, y, z]) => [2 * x! + 1, y! - z!]));
    expect(found.mean[0]).toBeCloseTo(3, 12);
    expect(found.mean[1]).toBeCloseTo(-2.5, 12);
    expect(found.covariance[0]![0]).toBeCloseTo(16, 12);
    expect(found.covariance[0]![1]).toBeCloseTo(2 * (1 + 0.5), 12);
    expect(found.covariance[1]![1]).toBeCloseTo(2 + 1 - 2 * 0.3, 12);
  });

  it('is exact for the mean of a square: m^2 + variance', () => {
    const found = momentsOf(moved(([x, y]) => [x! ** 2, x! * y!]));
    expect(found.mean[0]).toBeCloseTo(1 + 4, 12);
    expect(found.mean[1]).toBeCloseTo(-2 + 1, 12);
  });

  it('finds the mean of an exponential, exp(m + variance / 2), within 3 % at a sigma of 0.7', () => {
    const points = sigmaPoints([0.2], [[0.49]]).map(({ at, weight }) => ({
      at: Float64Array.from(at, (value) => Math.exp(value)),
      weight,
    }));
    const exact = Math.exp(0.2 + 0.49 / 2);
    expect(Math.abs(momentsOf(points).mean[0]! / exact - 1)).toBeLessThan(0.03);
  });
});

describe("Hampel's weight", () => {
  it.each([
    [0, 1],
    [2.5, 1],
    [-2.75, 2.5 / 2.75],
    [3, 2.5 / 3],
    [4, (2.5 / 4) * 0.5],
    [-5, 0],
    [50, 0],
  ])('of a value %d sigmas off is %d', (distance, weight) => {
    expect(hampelWeight(distance)).toBeCloseTo(weight, 12);
  });
});
