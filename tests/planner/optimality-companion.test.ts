import highsLoader, { type Highs } from 'highs';
import { beforeAll, describe, expect, it } from 'vitest';
import { belowMaximum } from '@/lib/planner/below-maximum';
import { companionWeek } from '@/lib/planner/companion-week';
import { contextOf } from '@/lib/planner/context';
import { evaluate } from '@/lib/planner/cost';
import { searchPlan } from '@/lib/planner/search';
import { sketchWeek } from '@/lib/planner/week-sketch';
import { solveLinearly } from './linear-programme';
import { summerPool } from './optimality-scenarios';

let highs: Highs;
beforeAll(async () => {
  highs = await highsLoader();
});

const scenarios = Array.from({ length: 8 }, (_, index) => {
  const scenario = summerPool(60 + index, { visits: 3 + (index % 3) });
  return {
    name: `pool ${60 + index}`,
    scenario: { ...scenario, reading: { ...scenario.reading, totalAlkalinity: 60 } },
  };
});

describe('beside a companion, too, chlorine costs at most 1.01 times the plan that solves the linear problem exactly', () => {
  it.each(scenarios)('$name', ({ scenario }) => {
    const { sketch, companion } = companionWeek(sketchWeek(contextOf(scenario)));
    const { context, choice, options, response, sketches } = sketch;
    expect(companion!.planned.substance).toBe('sodium-bicarbonate');
    const solved = evaluate(solveLinearly(highs, context, choice, options.fast[0]!), choice, context);
    expect(belowMaximum(solved, choice, context)).toBe(true);
    const { cost } = searchPlan(context, response, choice, sketches);
    expect(cost.total).toBeLessThanOrEqual(1.01 * solved.cost.total);
  });
});
