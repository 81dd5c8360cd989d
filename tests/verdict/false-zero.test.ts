import { describe, expect, it } from 'vitest';
import { falseZeroQuestion } from '@/lib/verdict/false-zero';
import { HOUR, takenAt } from './inputs';

describe('a zero that may be far too much', () => {
  it.each<[string, number, number | undefined, number | undefined, string | undefined]>([
    ['below half of the low edge', 1.2, 2.5, undefined, 'far-below-likely-range'],
    ['exactly half of it', 1.25, 2.5, undefined, undefined],
    ['none, a day after a dose', 0, undefined, 24, 'none-after-dose'],
    ['0.5, 72 hours after a dose', 0.5, 0.8, 72, 'none-after-dose'],
    ['0.5, longer after it', 0.5, 0.8, 72.1, undefined],
    ['0.6 after a dose', 0.6, 0.8, 24, undefined],
    ['none, never dosed, low edge unknown', 0, undefined, undefined, undefined],
    ['none, dosed only afterwards', 0, undefined, -1, undefined],
    ['none, where the low edge is none as well', 0, 0, undefined, undefined],
  ])('%s', (_, value, lowEdge, hoursAfterDose, cause) => {
    const lastDoseAt = hoursAfterDose === undefined ? undefined : takenAt - hoursAfterDose * HOUR;
    expect(falseZeroQuestion({ value, takenAt }, lowEdge, lastDoseAt)).toBe(cause);
  });
});
