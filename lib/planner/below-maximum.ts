import { bandOf } from '@/lib/projection/quantiles';
import { limits } from '@/lib/standards/limits';
import type { PlanContext } from './context';
import { evaluate, type Evaluated } from './cost';
import type { Choice, Draft } from './draft';

/** Whether the likely range stays at or under 10 mg/L from the first dose of a plan on. Nothing to add keeps to it. */
export function belowMaximum({ draft, courses }: Evaluated, { evenings }: Choice, { hours }: PlanContext): boolean {
  const used = evenings.filter((_, evening) => usesEvening(draft, evening));
  const first = Math.min(...used.map(({ at }) => at));
  const { value: maximum } = limits.freeChlorineMaximum;
  const rows = courses.map(({ hourly }) => hourly.freeChlorine);
  if (rows.every((row) => row.every((level) => level <= maximum))) return true;
  return bandOf(rows).p90.every((level, hour) => hours[hour]! < first || level <= maximum);
}

/** Takes a fifth of the largest dose out of a plan, in the end tablets, until it stays below the maximum. */
export function lowered(plan: Evaluated, choice: Choice, context: PlanContext): Evaluated {
  let next = plan;
  while (!belowMaximum(next, choice, context)) next = evaluate(less(next.draft), choice, context);
  return next;
}

function less(draft: Draft): Draft {
  const most = Math.max(...draft.measures);
  const smaller = (counts: readonly number[]) => {
    const largest = counts.indexOf(Math.max(...counts));
    return counts.map((each, evening) => (evening === largest ? each - Math.ceil(each / 5) : each));
  };
  return most > 0 ? { ...draft, measures: smaller(draft.measures) } : { ...draft, tablets: smaller(draft.tablets) };
}

function usesEvening({ tablets, measures }: Draft, evening: number): boolean {
  return measures[evening]! > 0 || tablets[evening]! > 0;
}
