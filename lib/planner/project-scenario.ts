import { analysisAt } from '@/lib/projection';
import { integrateWeek } from '@/lib/projection/integrate';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import { frame, planWithout } from './bare-plan';
import { contextOf, type PlanContext } from './context';
import { weekDoseOf } from './given-doses';
import { brokenLimits, openSwimShare } from './limits-broken';
import { needsOf } from './needs';
import { projectionOf } from './projection-of';

/** Projects the scenario's own `doses` and plans nothing: bands, broken limits and the end of the week for them. */
export function projectScenario(scenario: Scenario): WeekPlan {
  const { blocking, wanted } = needsOf(scenario);
  if (blocking.length > 0) return planWithout(scenario, [...blocking, ...wanted]);
  const base = contextOf(scenario);
  const doses = (scenario.doses ?? []).map((dose, index) =>
    weekDoseOf(dose, `doses[${index}]`, scenario.shelf, scenario.pool),
  );
  const stabilized = base.stabilizedProductUsed || doses.some(({ kind }) => kind === 'tablets');
  const everything = [...base.given, ...doses];
  const run = ({ start, setting }: PlanContext['median']) => integrateWeek(base.forcing, start, everything, setting);
  const median = run(base.median);
  const projection = projectionOf(base.members.map(run), median, base, stabilized);
  return {
    ...frame(base),
    projection,
    doses: [],
    checks: [],
    endOfWeek: analysisAt(median.end, median.endPH),
    cost: null,
    mix: null,
    alternatives: [],
    openSwimShare: openSwimShare(projection, [], base),
    broken: brokenLimits(projection, base, stabilized),
    reasons: [],
    cautions: [],
    needs: wanted,
  };
}
