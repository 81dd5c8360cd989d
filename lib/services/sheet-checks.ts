import 'server-only';
import type { StoredPlan } from '@/db/queries/plans';
import type { StoredReading } from '@/db/queries/readings';
import { dayOf, startOfDay } from '@/lib/calendar/household-day';
import type { WeekSheet } from '@/lib/schemas/week-sheet';

/**
 * The tests that the plan asks for. One is done by a reading later than the plan's own, on the day of the check or after it;
 * a full test only by a full test.
 */
export function sheetChecks(
  plan: StoredPlan | null,
  readings: readonly StoredReading[],
  timeZone: string,
): WeekSheet['checks'] {
  if (!plan) return [];
  return plan.result.checks.map((check) => {
    const earliest = startOfDay(dayOf(Date.parse(check.at), timeZone), timeZone);
    const done = readings.some(
      ({ takenAt, kind }) =>
        takenAt.getTime() >= earliest &&
        takenAt.getTime() > plan.takenAt.getTime() + 1000 &&
        (check.kind === 'quick' || kind === 'full'),
    );
    return { ...check, done };
  });
}
