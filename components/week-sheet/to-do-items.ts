import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { RecordedReading } from '@/lib/schemas/reading';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import type { Check } from './checks';
import { doseInstant } from './dose-state';
import { instantOf, type SheetDay } from './sheet-times';

export type ToDoItem =
  | { kind: 'dose'; at: number; dose: PlanDose }
  | { kind: 'check'; at: number; check: Check }
  | { kind: 'reading'; at: number; reading: RecordedReading };

/** What is to be done and what was done on a day, in the order of its hours. A check that was made shows as its reading. */
export function toDoOf(day: SheetDay, { doses, checks, readings }: WeekSheet): ToDoItem[] {
  const items: ToDoItem[] = [
    ...doses.map((dose) => ({ kind: 'dose' as const, at: doseInstant(dose), dose })),
    ...checks.filter(({ done }) => !done).map((check) => ({ kind: 'check' as const, at: instantOf(check.at), check })),
    ...readings.map((reading) => ({ kind: 'reading' as const, at: instantOf(reading.takenAt), reading })),
  ];
  return items.filter(({ at }) => at >= day.from && at < day.to).toSorted((a, b) => a.at - b.at);
}
