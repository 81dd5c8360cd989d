import highsLoader, { type Highs } from 'highs';
import { beforeAll, describe, expect, it } from 'vitest';
import { planWeek } from '@/lib/planner';
import { belowMaximum } from '@/lib/planner/below-maximum';
import { contextOf } from '@/lib/planner/context';
import { evaluate } from '@/lib/planner/cost';
import type { Choice } from '@/lib/planner/draft';
import { openEvenings } from '@/lib/planner/evenings';
import { optionsOf } from '@/lib/planner/products';
import { solveLinearly } from './linear-programme';
import { summerPool } from './optimality-scenarios';

let highs: Highs;
beforeAll(async () => {
  highs = await highsLoader();
});

/** LONG=1 solves all 40 pools; the first 15 have every number of visits three times at least. */
const pools = process.env.LONG === '1' ? 40 : 15;

const scenarios = Array.from({ length: pools }, (_, index) => ({
  name: `pool ${20 + index}`,
  scenario: summerPool(20 + index, { visits: 2 + (index % 4) }),
}));

describe('a plan costs at most 1.01 times the plan that solves the linear problem exactly, both projected in full', () => {
  it.each(scenarios)('$name', ({ scenario }) => {
    const context = contextOf(scenario);
    const { tablets, fast } = optionsOf(context);
    const choice: Choice = { evenings: openEvenings(context), visits: scenario.preferences.visits, tablets };
    const draft = solveLinearly(highs, context, choice, fast[0]!);
    const solved = evaluate(draft, choice, context);
    expect(solved.draft.measures.concat(solved.draft.tablets).some((count) => count > 0)).toBe(true);
    expect(belowMaximum(solved, choice, context)).toBe(true);

    const { cost, doses } = planWeek(scenario);
    expect(doses.every(({ substance }) => /trichlor|hypochlorite/.test(substance))).toBe(true);
    expect(cost!.total).toBeLessThanOrEqual(1.01 * solved.cost.total);
  });
});
