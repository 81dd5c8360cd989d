import { limits } from '@/lib/standards/limits';
import type { MeasuredValue } from './input';
import { HOUR } from './outlook';

export type FalseZeroCause = 'far-below-likely-range' | 'none-after-dose';

/**
 * Whether a reading of free chlorine has to be asked about before it counts: strong chlorine bleaches the colour, so
 * "none" can mean far too much (care.md 2). Undefined when there is nothing to ask.
 *
 * Asked when it is below half of the low edge of what was projected for its instant, or when it is 0 to 0.5 mg/L within
 * 72 hours of a dose of chlorine.
 *
 * @param reading    free chlorine [mg/L] and when it was read
 * @param lowEdge    p10 [mg/L] that the projection before this reading gave for its instant, where there is one
 * @param lastDoseAt instant [ms] of the last dose of chlorine before the reading, where there is one
 * Source: care.md 2; the limits with their sources in lib/standards.
 */
export function falseZeroQuestion(
  reading: MeasuredValue,
  lowEdge: number | undefined,
  lastDoseAt: number | undefined,
): FalseZeroCause | undefined {
  if (lowEdge !== undefined && reading.value < lowEdge / 2) return 'far-below-likely-range';
  const sinceDose = lastDoseAt === undefined ? Infinity : (reading.takenAt - lastDoseAt) / HOUR;
  const soonAfter = sinceDose >= 0 && sinceDose <= limits.falseZeroAfterDose.value;
  return soonAfter && reading.value <= limits.falseZeroReading.value ? 'none-after-dose' : undefined;
}
