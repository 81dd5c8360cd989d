import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { longDay, timeOfDay } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import { explain } from '@/lib/cli/plan/explain';
import { planWeek } from '@/lib/planner';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import { anyScenario } from '../planner/any-scenario';
import { scenarioOf } from '../planner/scenarios';
import { propertySeed } from '../support/property-seed';

/** Every number and every text that stands anywhere in a value. */
function leavesOf(value: unknown): (number | string)[] {
  if (typeof value === 'number' || typeof value === 'string') return [value];
  if (value === null || typeof value !== 'object') return [];
  return Object.values(value).flatMap(leavesOf);
}

/** The numbers of an explanation that no number of the plan rounds to; days, times and texts of the plan left out. */
function inventedIn(text: string, plan: WeekPlan, { pool }: Scenario): string[] {
  const leaves = leavesOf(JSON.parse(JSON.stringify(plan)));
  const texts = leaves.filter((leaf) => typeof leaf === 'string');
  const instants = texts.filter((leaf) => /^\d{4}-\d\d-\d\dT/.test(leaf)).map((leaf) => Date.parse(leaf));
  const days = new Set(instants.map((instant) => longDay(dayOf(instant, pool.timeZone), 'en-GB')));
  const times = new Set(instants.map((instant) => timeOfDay(instant, pool.timeZone, 'en-GB')));
  let rest = text.replaceAll(pool.timeZone, '').replace(`engine ${plan.engineVersion}.`, '');
  for (const said of [...days, ...times, ...texts.filter((leaf) => /[a-z].*\d|\d.*[a-z]/i.test(leaf))])
    rest = rest.replaceAll(said, '');
  const numbers = leaves.filter((leaf) => typeof leaf === 'number');
  return [...rest.replaceAll('−', '-').matchAll(/-?\d+(?:,\d{3})*(?:\.(\d+))?/g)].flatMap(([token, decimals = '']) => {
    const value = Number(token.replaceAll(',', ''));
    const half = 0.5 * 10 ** -decimals.length * (1 + 1e-9);
    // Grams and millilitres are said in kilograms and litres where they are many.
    return numbers.some((number) => [1, 1000].some((unit) => Math.abs(number / unit - value) <= half)) ? [] : [token];
  });
}

describe('an explanation in plain text', () => {
  it('has no number that is not in the plan', () => {
    fc.assert(
      fc.property(anyScenario, (scenario) => {
        let plan: WeekPlan;
        try {
          plan = planWeek(scenario);
        } catch {
          // A scenario that cannot be planned has nothing to explain.
          return;
        }
        expect(inventedIn(explain(scenario, plan), plan, scenario)).toEqual([]);
      }),
      { numRuns: 60, seed: propertySeed },
    );
  });

  it('would be caught inventing one', () => {
    const scenario = scenarioOf();
    const plan = planWeek(scenario);
    const text = explain(scenario, plan);
    expect(inventedIn(text, plan, scenario)).toEqual([]);
    expect(inventedIn(`${text} 777.7 mg/L`, plan, scenario)).toEqual(['777.7']);
  });
});
