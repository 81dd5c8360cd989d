import { describe, expect, it } from 'vitest';
import { planWeek } from '@/lib/planner';
import { belowMaximum } from '@/lib/planner/below-maximum';
import { contextOf, type PlanContext } from '@/lib/planner/context';
import { evaluate, type Evaluated } from '@/lib/planner/cost';
import type { Choice, Draft } from '@/lib/planner/draft';
import { openEvenings } from '@/lib/planner/evenings';
import { type FastOption, optionsOf } from '@/lib/planner/products';
import { summerPool } from './optimality-scenarios';

const MEASURES = 3;
const MOST_TABLETS = 6;

/** Every set of up to so many evenings out of so many. */
function setsOf(evenings: number, most: number, from = 0): number[][] {
  if (most === 0) return [[]];
  const sets: number[][] = [[]];
  for (let evening = from; evening < evenings; evening++)
    for (const rest of setsOf(evenings, most - 1, evening + 1)) sets.push([evening, ...rest]);
  return sets;
}

/** Every draft: on each evening nothing, one to three measures, or one to six tablets, loaded twice at most. */
function everyDraft({ evenings, visits, tablets }: Choice, fast: FastOption): Draft[] {
  const mostTablets = tablets?.most ?? 0;
  const none = evenings.map(() => 0);
  return setsOf(evenings.length, visits).flatMap((set) => {
    let drafts: Draft[] = [{ tablets: none, fast, measures: none }];
    for (const evening of set)
      drafts = drafts.flatMap((draft) => [
        ...Array.from({ length: MEASURES }, (_, less) => ({
          ...draft,
          measures: draft.measures.with(evening, less + 1),
        })),
        ...Array.from({ length: mostTablets }, (_, less) => ({
          ...draft,
          tablets: draft.tablets.with(evening, less + 1),
        })),
      ]);
    return drafts.filter((draft) => {
      const count = draft.tablets.reduce((sum, each) => sum + each, 0);
      return count <= mostTablets && draft.tablets.filter((each) => each > 0).length <= 2;
    });
  });
}

/**
 * The cheapest of all drafts that costs less than a bound, each projected in full over the whole ensemble. What the median
 * alone, and it and a quarter of the ensemble, make of a draft can only grow with the rest of the ensemble: a draft that is
 * dearer already by these is not projected any further.
 */
function cheaperThan(bound: number, drafts: readonly Draft[], choice: Choice, context: PlanContext): Evaluated | null {
  const quarter = context.members.slice(0, context.members.length / 4);
  let least = bound;
  let cheapest: Evaluated | null = null;
  for (const draft of drafts) {
    const byMedian = evaluate(draft, choice, context, []).cost.total;
    if (byMedian >= least) continue;
    const byQuarter = evaluate(draft, choice, context, quarter).cost.total;
    if (byMedian + (byQuarter - byMedian) / 4 >= least) continue;
    const whole = evaluate(draft, choice, context);
    if (whole.cost.total < least && belowMaximum(whole, choice, context)) [least, cheapest] = [whole.cost.total, whole];
  }
  return cheapest;
}

// Three evenings of three left, and two of five.
const scenarios = Array.from({ length: 20 }, (_, index) => ({
  name: `pool ${index}`,
  scenario:
    index % 2 === 0
      ? summerPool(index, { visits: 3, measuresInACap: MEASURES, now: 89 })
      : summerPool(index, { visits: 2, measuresInACap: MEASURES, now: 41 }),
}));

describe('a plan costs at most 1.01 times the best of all plans', () => {
  it.each(scenarios)('$name', ({ scenario }) => {
    const context = contextOf(scenario);
    const { tablets, fast } = optionsOf(context);
    const choice: Choice = { evenings: openEvenings(context), visits: scenario.preferences.visits, tablets };
    const drafts = everyDraft(choice, fast[0]!);
    expect(fast).toHaveLength(1);
    expect(Math.max(...drafts.flatMap(({ measures }) => measures))).toBe(MEASURES);
    expect(tablets!.most).toBeLessThanOrEqual(MOST_TABLETS);

    const { cost, doses } = planWeek(scenario);
    expect(doses.every(({ substance }) => /trichlor|hypochlorite/.test(substance))).toBe(true);
    const cheaper = cheaperThan(cost!.total / 1.01, drafts, choice, context);
    expect(cheaper && { ...cheaper.draft, cost: cheaper.cost.total, plan: cost!.total }).toBeNull();
  });
});
