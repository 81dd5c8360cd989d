import { describe, expect, it } from 'vitest';
import { clearDay, exposureOf, spanOf, sunlitHours } from '@/lib/client/clear-day';

const madrid = clearDay(40.4, -3.7, 'Europe/Madrid');

describe('a clear midsummer day over a pool', () => {
  it('has the sun up for the fifteen hours of a July day in Madrid, late on the clock', () => {
    // Within the quarter hours that the day is cut into.
    const { from, to } = sunlitHours(madrid);
    expect(from).toBeCloseTo(6.9, 0);
    expect(to).toBeCloseTo(21.75, 0);
  });

  it('gives all of it to a pool that nothing shades, and half to one shaded until the sun stands highest', () => {
    expect(exposureOf(madrid, { from: 0, to: 24 })).toBe(1);
    // True noon is about 14:20 on the summer clock there.
    expect(exposureOf(madrid, { from: 14.25, to: 24 })).toBeCloseTo(0.5, 1);
  });

  it('finds hours that give a share again', () => {
    for (const exposure of [1, 0.9, 0.6, 0.3])
      expect(Math.abs(exposureOf(madrid, spanOf(madrid, exposure)) - exposure)).toBeLessThan(0.08);
  });

  it('takes January in the south', () => {
    const perth = clearDay(-32, 115.9, 'Australia/Perth');
    const { from, to } = sunlitHours(perth);
    expect(to - from).toBeGreaterThan(13.5);
  });

  it('has no share to give where the sun never rises', () => {
    expect(exposureOf(Array<number>(96).fill(0), { from: 0, to: 24 })).toBe(0);
  });
});
