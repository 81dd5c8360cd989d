import { describe, expect, it } from 'vitest';
import { normalQuantile } from '@/lib/projection/normal';

describe('normalQuantile', () => {
  it.each([
    // Published quantiles of the standard normal distribution, as in any table of it.
    [0.5, 0],
    [0.9, 1.2815515655],
    [0.95, 1.644853627],
    [0.975, 1.9599639845],
    [0.99, 2.326347874],
    [0.995, 2.5758293035],
    [0.999, 3.0902323062],
    [0.9999, 3.7190164855],
  ])('of %d is %d', (share, quantile) => {
    expect(normalQuantile(share)).toBeCloseTo(quantile, 7);
    expect(normalQuantile(1 - share)).toBeCloseTo(-quantile, 7);
  });
});
