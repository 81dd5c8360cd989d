import { dayOf } from '@/lib/calendar/household-day';
import { seriesOf } from '@/lib/projection';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Alternative } from '@/lib/schemas/plan';
import { lowestLevel } from '@/lib/standards/limits';
import type { PlanContext } from './context';
import { evaluate, type Evaluated, moneyOf, stabilizedIn } from './cost';
import { type Choice, emptyDraft, visitsOf } from './draft';
import { plannedDoses } from './planned-doses';
import type { Options } from './products';
import type { Response } from './response';
import { quickPlan } from './search';

/** The best week with each form alone: what the household gives up or gains against the plan's mix. */
export function alternativesOf(
  context: PlanContext,
  response: Response,
  choice: Choice,
  options: Options,
): Alternative[] {
  const without: Choice = { ...choice, tablets: null };
  const only = (kind: Alternative['kind']): Evaluated | null => {
    if (kind === 'tablets') return options.tablets ? quickPlan(context, response, { choice, fast: [null] }) : null;
    const fast = options.fast.filter(({ form }) => form === kind);
    return fast.length > 0 ? quickPlan(context, response, { choice: without, fast }) : null;
  };
  return (['tablets', 'granular', 'liquid'] as const).map((kind) => {
    const found = only(kind);
    const nothing = () =>
      evaluate(
        emptyDraft(without),
        without,
        context,
        context.searchMembers.map(({ member }) => member),
      );
    return alternativeOf(kind, found ?? nothing(), found !== null, context);
  });
}

function alternativeOf(
  kind: Alternative['kind'],
  found: Evaluated,
  possible: boolean,
  context: PlanContext,
): Alternative {
  const doses = plannedDoses(found.draft, found.choice, context);
  const burden = burdenOf(found, doses, context);
  return { kind, feasible: possible && burden.hoursOutside === 0, doses, ...burden, total: found.cost.total };
}

/** What a week asks of the household and leaves in the water, by the median. */
export function burdenOf({ draft, choice, median }: Evaluated, doses: readonly PlannedDose[], context: PlanContext) {
  const water = seriesOf(median);
  const { swimLimit } = context.scenario.pool;
  const hoursOutside = water.freeChlorine.filter((level, hour) => {
    const lowest = lowestLevel(water.cyanuricAcid[hour]!, stabilizedIn(draft, context));
    return level < lowest || (context.swimHour[hour] === true && level > swimLimit);
  }).length;
  return {
    money: moneyOf(draft, choice),
    visits: visitsOf(draft),
    swing: swingOf(water.freeChlorine, context),
    stabilizer: water.cyanuricAcid.at(-1)! - water.cyanuricAcid[0]!,
    hardness: water.calciumHardness.at(-1)! - water.calciumHardness[0]!,
    kilograms: doses.reduce((sum, dose) => sum + kilogramsOf(dose, choice), 0),
    hoursOutside,
  };
}

/** Mean over the days of the difference between highest and lowest free chlorine [mg/L]. */
function swingOf(freeChlorine: ArrayLike<number>, { hours, scenario }: PlanContext): number {
  const days = new Map<string, { low: number; high: number }>();
  hours.forEach((hour, index) => {
    const day = dayOf(hour, scenario.pool.timeZone);
    const level = freeChlorine[index]!;
    const seen = days.get(day) ?? { low: level, high: level };
    days.set(day, { low: Math.min(seen.low, level), high: Math.max(seen.high, level) });
  });
  const swings = [...days.values()].map(({ low, high }) => high - low);
  return swings.reduce((sum, swing) => sum + swing, 0) / swings.length;
}

/** Density of liquid hypochlorite [kg/L]. */
const LIQUID_DENSITY = 1.2;

function kilogramsOf(dose: PlannedDose, { tablets }: Evaluated['choice']): number {
  if (dose.unit === 'tablet') return (dose.amount * (tablets?.tabletMass ?? 0)) / 1000;
  return (dose.amount / 1000) * (dose.unit === 'mL' ? LIQUID_DENSITY : 1);
}
