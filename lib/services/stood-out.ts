import 'server-only';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { StoodOut } from '@/lib/schemas/learnt';
import type { LearningNote } from '@/lib/schemas/posterior';

/** What of one test did not simply count, with what was expected of it 8 times in 10. */
export function stoodOutOf(log: readonly LearningNote[], takenAt: Date, timeZone: string): StoodOut[] {
  return log.flatMap((note) => {
    if (note.kind === 'fresh-start' || note.kind === 'left-out' || note.kind === 'counted') return [];
    const { kind, quantity, measured, expected } = note;
    const { p10: low, p90: high } = expected;
    return [{ takenAt: toOffsetIso(takenAt.getTime(), timeZone), kind, quantity, measured, low, high }];
  });
}
