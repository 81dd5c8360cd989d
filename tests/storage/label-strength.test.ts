import { describe, expect, it } from 'vitest';
import { tradePercentOf } from '@/lib/storage/label-strength';

describe('strength of liquid chlorine as printed', () => {
  it('agrees with the published example: 12.5 % by weight is about 142 g of available chlorine per litre', () => {
    // shared/reference/sources.md, part on strengths: 12.5 wt % NaOCl (s.g. about 1.19) is about 14 trade %.
    expect(tradePercentOf(12.5, 'hypochlorite-by-weight')).toBeCloseTo(14.2, 1);
  });

  it('keeps the ratio of 1.05 between hypochlorite and available chlorine by weight', () => {
    expect(tradePercentOf(10.5, 'hypochlorite-by-weight')).toBeCloseTo(tradePercentOf(10, 'available-by-weight'), 1);
  });

  it('leaves trade per cent as it is and never confuses the four ways of saying "10 %"', () => {
    expect(tradePercentOf(10, 'trade')).toBe(10);
    const all = (['trade', 'available-by-weight', 'hypochlorite-by-weight', 'hypochlorite-by-volume'] as const).map(
      (basis) => tradePercentOf(10, basis),
    );
    expect(new Set(all.map((strength) => strength.toFixed(1))).size).toBe(4);
  });
});
