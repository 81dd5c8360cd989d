import type { Scenario } from '@/lib/schemas/scenario';
import type { Wishes } from '@/lib/schemas/wishes';
import { type CompanionWeek, companionWeek } from './companion-week';
import { companionsOf } from './companions/companion';
import type { CompanionNeed } from './companions/need';
import { contextOf, type PlanContext } from './context';
import { byMedian, evaluate, type Evaluated } from './cost';
import { halveFirstDose } from './first-dose';
import { searchPlan } from './search';
import { sketchWeek, type WeekSketch } from './week-sketch';

/** A week's chlorine as it was searched for, its first dose halved where that is asked for, and what goes in beside it. */
export type FoundWeek = CompanionWeek & { best: Evaluated; halvedEvening: number | null };

/**
 * The best week, and the companion that it needs. Which one that is was told by sketches: what is found around it may come
 * to need less chlorine, and then no companion either, and is searched without. Nothing is said to wait that nothing needs.
 */
export function findWeek(scenario: Scenario, wishes: Wishes): FoundWeek {
  const alone = sketchWeek(contextOf(scenario, { wishes }));
  const week = companionWeek(alone);
  const found = searched(week);
  const needs = needsBeside(found, alone);
  const isNeeded = (reason: string) => needs.some((need) => need.reason === reason);
  if (week.companion && !isNeeded(week.companion.planned.reason)) {
    const without = searched({ sketch: alone, companion: null, waiting: null });
    return { ...without, waiting: needsBeside(without, alone)[0] ?? null };
  }
  return { ...found, waiting: week.waiting && isNeeded(week.waiting.reason) ? week.waiting : null };
}

function searched(week: CompanionWeek): FoundWeek {
  const { context, response, choice, sketches } = week.sketch;
  const found = searchPlan(context, response, choice, sketches);
  const { draft, halvedEvening } = wishedComesFirst(found, context)
    ? { draft: found.draft, halvedEvening: null }
    : halveFirstDose(found.draft, context.scenario);
  const best = draft === found.draft ? found : evaluate(draft, choice, context);
  return { ...week, best, halvedEvening };
}

/** What a found week's chlorine needs beside it, had nothing gone in beside it. */
function needsBeside({ best }: FoundWeek, alone: WeekSketch): CompanionNeed[] {
  return companionsOf(byMedian(best.draft, best.choice, alone.context), alone).needs;
}

/** Whether a wished dose goes in before all that the search found. */
function wishedComesFirst({ draft, choice }: Evaluated, { wished }: PlanContext): boolean {
  const found = choice.evenings.filter((_, evening) => draft.tablets[evening]! > 0 || draft.measures[evening]! > 0);
  return Math.min(...wished.map(({ at }) => at)) < Math.min(...found.map(({ at }) => at));
}
