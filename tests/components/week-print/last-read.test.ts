import { describe, expect, it } from 'vitest';
import { lastRead } from '@/components/week-print/last-read';
import type { RecordedReading } from '@/lib/schemas/reading';
import { aWeekSheet } from '@/tests/support/week-sheet';

function aReading(takenAt: string, values: RecordedReading['values']): RecordedReading {
  return { ...aWeekSheet().lastReading!, takenAt, values };
}

describe('what was read last', () => {
  it('of each quantity, in whatever order the tests are told', () => {
    const old = aReading('2026-07-05T19:00:00+02:00', { freeChlorine: 2.4, pH: 7.4, totalAlkalinity: 90 });
    const check = aReading('2026-07-07T19:00:00+02:00', { freeChlorine: { low: 1, high: 3 }, pH: 7.5 });
    for (const readings of [
      [old, check],
      [check, old],
    ])
      expect(lastRead(readings)).toEqual({
        freeChlorine: { low: 1, high: 3 },
        pH: { low: 7.5, high: 7.5 },
        totalAlkalinity: { low: 90, high: 90 },
      });
  });

  it('total chlorine is the sum within one test, never of two', () => {
    const both = aReading('2026-07-05T19:00:00+02:00', { freeChlorine: 2.4, combinedChlorine: 0.2 });
    const later = aReading('2026-07-06T19:00:00+02:00', { freeChlorine: 3.1 });
    const { totalChlorine } = lastRead([later, both]);
    expect(totalChlorine?.low).toBeCloseTo(2.6, 9);
    expect(lastRead([later]).totalChlorine).toBeUndefined();
  });
});
