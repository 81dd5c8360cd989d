import { analysisAt, type CourseBand } from '@/lib/projection';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Burden, Cost, WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import { alternativesOf, burdenOf } from './alternatives';
import { assertSafePlan } from './safety/assert-safe-plan';
import { frame, planWithout } from './bare-plan';
import { checksOf } from './checks';
import type { Companion } from './companions/companion';
import type { DoseReason } from './codes';
import type { PlanContext } from './context';
import { type Evaluated, moneyOf, stabilizedIn } from './cost';
import { cautionsOf, reasonsOf } from './explain';
import { findWeek } from './found-week';
import { brokenLimits, openSwimShare } from './limits-broken';
import { midWeekTestPays } from './mid-week-test';
import { needsOf } from './needs';
import { plannedDoses } from './planned-doses';
import { projectionOf } from './projection-of';
import { isFirstEver, refuseWishes } from './refuse-wishes';
import { weights } from './weights';
import { costWithWished, type Wished, wishedIn } from './wished-doses';
import { isEmptyWish, noWishes, wishesInForce } from './wishes';

export { assertSafePlan } from './safety/assert-safe-plan';
export { projectScenario } from './project-scenario';
export { holdWeek, treatmentWeek } from './treatment-week';
export { tryOutOpenings } from './try-out-openings';
export { ENGINE_VERSION } from './version';
export type { CourseBand };

/**
 * The week's plan: which form of chlorine, how much, which evening, for 168 h from the newest reading.
 *
 * Minimises the whole cost over the ensemble (see `weights`) under the safety constraints; when nothing keeps the range it
 * is the least bad plan and `broken` says which limit, when, by how much. Deterministic. What the household wishes stands as
 * it is wished, within the same limits, and the rest is planned around it.
 *
 * Errors: invalid-input for a given dose of an unknown product; WaterRangeError for water that cannot be; plan-refused
 * when the safety net finds a fault in the result, or in what was wished.
 */
export function planWeek(scenario: Scenario): WeekPlan {
  const { blocking, wanted } = needsOf(scenario);
  if (blocking.length > 0) return planWithout(scenario, [...blocking, ...wanted]);
  const wishes = wishesInForce(scenario);
  const { sketch, companion, waiting, best, halvedEvening } = findWeek(scenario, wishes);
  const { context, options, choice } = sketch;
  const { draft } = best;

  const stabilized = stabilizedIn(draft, context);
  const searched = plannedDoses(draft, choice, context, halvedEvening);
  const wished = firstMarked(wishedIn(context), searched, context);
  const chlorine = inOrder([...searched, ...wished.doses]);
  refuseWishes(wished.doses, chlorine[0], context);
  const doses = companion ? inOrder([...chlorine, companion.planned]) : chlorine;
  const projection = projectionOf(best.courses, best.median, context, stabilized);
  const broken = brokenLimits(projection, context, stabilized);
  const openShare = openSwimShare(projection, doses, context);
  // What each form alone would do has nothing to do with what was wished.
  const alternatives = isEmptyWish(wishes)
    ? alternativesOf(sketch, best).map((way) => ({ ...way, total: way.total + costOfCompanion(companion, scenario) }))
    : planWeek({ ...scenario, wishes: noWishes }).alternatives;
  const cost = withCompanion(costWithWished(best, wished, context), companion, scenario);
  const explained = {
    ...{ doses, chlorine, choice, options, alternatives, broken, openShare, waiting },
    money: moneyOf(draft, choice) + wished.burden.money,
    total: cost.total,
  };
  const plan: WeekPlan = {
    ...frame(context),
    projection,
    doses,
    checks: checksOf(projection, doses, companion, midWeekTestPays(best, context), context, stabilized),
    endOfWeek: endOf(best),
    cost,
    mix: withWished(burdenOf(best, searched, context), wished),
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

/** Where nothing has gone in yet and the volume is an estimate, the first dose is a half one and asks for a test after it. */
function firstMarked(wished: Wished, searched: readonly PlannedDose[], context: PlanContext): Wished {
  const [first] = inOrder([...searched, ...wished.doses]);
  if (!isFirstEver(context)) return wished;
  const reason = 'first-dose-halved' satisfies DoseReason;
  return { ...wished, doses: wished.doses.map((dose) => (dose === first ? { ...dose, reason } : dose)) };
}

function withWished(burden: Burden, { burden: { money, visits, kilograms } }: Wished): Burden {
  return {
    ...burden,
    money: burden.money + money,
    visits: burden.visits + visits,
    kilograms: burden.kilograms + kilograms,
  };
}

/** What the companion costs beside the chlorine, whatever form that has: its product and its visit. */
function partsOfCompanion(companion: Companion | null, { preferences }: Scenario) {
  if (!companion) return { money: 0, visits: 0 };
  return { money: preferences.money * companion.money, visits: preferences.evenings * weights.visit };
}

function costOfCompanion(companion: Companion | null, scenario: Scenario): number {
  const { money, visits } = partsOfCompanion(companion, scenario);
  return money + visits;
}

function withCompanion(cost: Cost, companion: Companion | null, scenario: Scenario): Cost {
  const { money, visits } = partsOfCompanion(companion, scenario);
  return {
    ...cost,
    money: cost.money + money,
    visits: cost.visits + visits,
    total: cost.total + costOfCompanion(companion, scenario),
  };
}

function endOf({ median }: Evaluated) {
  return analysisAt(median.end, median.endPH);
}
