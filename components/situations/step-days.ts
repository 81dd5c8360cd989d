import { addDays, type CalendarDay, dayOf, daysBetween, startOfDay } from '@/lib/calendar/household-day';
import type { OpenSituation, SituationStep } from '@/lib/schemas/situation';
import { instantOf } from './use-situation-times';

/** One day of a procedure, from midnight to midnight by the household's clock [ms]. */
export type StepDay = { day: CalendarDay; from: number; to: number; steps: readonly SituationStep[] };

/** A procedure that lasts longer is shown as a list of days, not in columns. */
const LONGEST = 14;

/** The days that have a step, in their order. Steps of one day stay in the order in which they protect. */
export function daysWithSteps(steps: readonly SituationStep[], timeZone: string): StepDay[] {
  const days = [...new Set(steps.map(({ at }) => dayOf(instantOf(at), timeZone)))].toSorted();
  return days.map((day) => dayFrom(day, steps, timeZone));
}

/** Every day from the opening to the last step, today among them; empty where they are too many for columns. */
export function everyDay({ openedAt, procedure }: OpenSituation, now: number, timeZone: string): StepDay[] {
  const { steps, mornings } = procedure;
  const days = [
    ...[openedAt, ...steps.map(({ at }) => at)].map((iso) => dayOf(instantOf(iso), timeZone)),
    ...mornings.map(({ day }) => day),
    dayOf(now, timeZone),
  ].toSorted();
  const [first, last] = [days[0], days.at(-1)];
  if (first === undefined || last === undefined) return [];
  const count = daysBetween(first, last) + 1;
  if (count > LONGEST) return [];
  return Array.from({ length: count }, (_, index) => dayFrom(addDays(first, index), steps, timeZone));
}

function dayFrom(day: CalendarDay, steps: readonly SituationStep[], timeZone: string): StepDay {
  return {
    day,
    from: startOfDay(day, timeZone),
    to: startOfDay(addDays(day, 1), timeZone),
    steps: steps.filter(({ at }) => dayOf(instantOf(at), timeZone) === day),
  };
}
