import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { RecordedReading } from '@/lib/schemas/reading';
import type { SituationStep } from '@/lib/schemas/situation';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import type { Check } from './checks';
import { doseInstant } from './dose-state';
import { instantOf, type SheetDay } from './sheet-times';

export type ToDoItem =
  | { kind: 'dose'; at: number; dose: PlanDose }
  | { kind: 'check'; at: number; check: Check }
  | { kind: 'reading'; at: number; reading: RecordedReading }
  | { kind: 'step'; at: number; step: SituationStep };

/** Steps of one situation may stand at one instant. */
export function keyOf(item: ToDoItem): string {
  return item.kind === 'step' ? `step ${item.step.id}` : `${item.kind} ${item.at}`;
}

/**
 * What is to be done and what was done on a day, in the order of its hours. A check that was made shows as its reading, a step
 * of an open situation that is overdue stands at now.
 */
export function toDoOf(day: SheetDay, sheet: WeekSheet): ToDoItem[] {
  const { doses, checks, readings } = sheet;
  const items: ToDoItem[] = [
    ...doses.map((dose) => ({ kind: 'dose' as const, at: doseInstant(dose), dose })),
    ...checks.filter(({ done }) => !done).map((check) => ({ kind: 'check' as const, at: instantOf(check.at), check })),
    ...stepsOf(sheet).map((step) => ({ kind: 'step' as const, at: stepInstant(step, sheet), step })),
    ...readings.map((reading) => ({ kind: 'reading' as const, at: instantOf(reading.takenAt), reading })),
  ];
  return items.filter(({ at }) => at >= day.from && at < day.to).toSorted((a, b) => a.at - b.at);
}

/** The steps of an open situation that have no other place on the sheet: doses and tests have theirs. */
function stepsOf({ situation, checks }: WeekSheet): SituationStep[] {
  const steps = situation?.procedure.steps ?? [];
  const asked = checks.some(({ done }) => !done);
  return steps.filter(({ kind, doneAt }) => kind === 'tick' || (kind === 'test' && doneAt === null && !asked));
}

function stepInstant({ at, doneAt }: SituationStep, { now }: WeekSheet): number {
  return doneAt === null ? Math.max(instantOf(at), instantOf(now)) : instantOf(doneAt);
}
