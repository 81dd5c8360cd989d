import { analysisAt, type CourseBand } from '@/lib/projection';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Cost, WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import { alternativesOf, burdenOf } from './alternatives';
import { assertSafePlan } from './safety/assert-safe-plan';
import { frame, planWithout } from './bare-plan';
import { checksOf } from './checks';
import { companionWeek } from './companion-week';
import type { Companion } from './companions/companion';
import { contextOf } from './context';
import { evaluate, type Evaluated, moneyOf, stabilizedIn } from './cost';
import { cautionsOf, reasonsOf } from './explain';
import { halveFirstDose } from './first-dose';
import { brokenLimits, openSwimShare } from './limits-broken';
import { midWeekTestPays } from './mid-week-test';
import { needsOf } from './needs';
import { plannedDoses } from './planned-doses';
import { projectionOf } from './projection-of';
import { searchPlan } from './search';
import { sketchWeek } from './week-sketch';
import { weights } from './weights';

export { assertSafePlan } from './safety/assert-safe-plan';
export { projectScenario } from './project-scenario';
export { holdWeek, treatmentWeek } from './treatment-week';
export { ENGINE_VERSION } from './version';
export type { CourseBand };

/**
 * The week's plan: which form of chlorine, how much, which evening, for 168 h from the newest reading.
 *
 * Minimises the whole cost over the ensemble (see `weights`) under the safety constraints; when nothing keeps the range it
 * is the least bad plan and `broken` says which limit, when, by how much. Deterministic.
 *
 * Errors: invalid-input for a given dose of an unknown product; WaterRangeError for water that cannot be; plan-refused
 * when the safety net finds a fault in the result.
 */
export function planWeek(scenario: Scenario): WeekPlan {
  const { blocking, wanted } = needsOf(scenario);
  if (blocking.length > 0) return planWithout(scenario, [...blocking, ...wanted]);
  const { sketch, companion, waiting } = companionWeek(sketchWeek(contextOf(scenario)));
  const { context, options, choice, response, sketches } = sketch;
  const found = searchPlan(context, response, choice, sketches);
  const { draft, halvedEvening } = halveFirstDose(found.draft, scenario);
  const best = draft === found.draft ? found : evaluate(draft, choice, context);

  const stabilized = stabilizedIn(draft, context);
  const chlorine = plannedDoses(draft, choice, context, halvedEvening);
  const doses = inOrder(companion ? [...chlorine, companion.planned] : chlorine);
  const projection = projectionOf(best.courses, best.median, context, stabilized);
  const broken = brokenLimits(projection, context, stabilized);
  const openShare = openSwimShare(projection, doses, context);
  const alternatives = alternativesOf(sketch, best);
  const explained = {
    ...{ doses, chlorine, choice, options, alternatives, broken, openShare, waiting },
    money: moneyOf(draft, choice),
  };
  const plan: WeekPlan = {
    ...frame(context),
    projection,
    doses,
    checks: checksOf(projection, doses, companion, midWeekTestPays(best, context), context, stabilized),
    endOfWeek: endOf(best),
    cost: withCompanion(best.cost, companion, scenario),
    mix: burdenOf(best, chlorine, context),
    alternatives,
    openSwimShare: openShare,
    broken,
    reasons: reasonsOf(explained, context),
    cautions: cautionsOf(explained, context),
    needs: wanted,
  };
  assertSafePlan(scenario, plan);
  return plan;
}

function inOrder(doses: readonly PlannedDose[]): PlannedDose[] {
  return doses.toSorted((a, b) => Date.parse(a.at) - Date.parse(b.at));
}

/** What the companion costs beside the chlorine: its product and its visit. */
function withCompanion(cost: Cost, companion: Companion | null, { preferences }: Scenario): Cost {
  if (!companion) return cost;
  const money = preferences.money * companion.money;
  const visit = preferences.evenings * weights.visit;
  return { ...cost, money: cost.money + money, visits: cost.visits + visit, total: cost.total + money + visit };
}

function endOf({ median }: Evaluated) {
  return analysisAt(median.end, median.endPH);
}
