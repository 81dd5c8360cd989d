import { saturationIndex } from '@/lib/chemistry';
import type { Alternative, BrokenLimit, Fact } from '@/lib/schemas/plan';
import type { PlannedDose } from '@/lib/schemas/dose';
import { limits, lowestLevel } from '@/lib/standards/limits';
import { surfaceRanges } from '@/lib/standards/surface-ranges';
import type { CautionCode, ReasonCode } from './codes';
import type { PlanContext } from './context';
import type { Choice } from './draft';
import type { Options } from './products';

const FEW_OPEN_HOURS = 0.9;

type Explained = {
  doses: readonly PlannedDose[];
  choice: Choice;
  options: Options;
  alternatives: readonly Alternative[];
  broken: readonly BrokenLimit[];
  openShare: number;
  /** What the products of the plan cost. */
  money: number;
};

/** Why this plan, as codes with their figures; what the person must know first comes first. */
export function reasonsOf(plan: Explained, context: PlanContext): Fact[] {
  const { doses, choice, options, broken, openShare } = plan;
  const reasons: Fact[] = [];
  const reason = (code: ReasonCode, figures: Omit<Fact, 'code'> = {}) => reasons.push({ code, ...figures });
  const { water } = context.start;
  const { pool, preferences } = context.scenario;
  const closed = broken.find(({ limit }) => limit === 'stabilizer-too-high-for-swim-limit');
  if (closed)
    reason('replace-water-first', { stabilizer: closed.value, closesAt: closed.bound, swimLimit: pool.swimLimit });
  if (openShare < FEW_OPEN_HOURS) reason('few-open-hours', { share: openShare, visits: preferences.visits });
  const tablets = doses.filter(({ form }) => form === 'tablet');
  const stabilized = context.stabilizedProductUsed || tablets.length > 0;
  const sum = (each: (dose: PlannedDose) => number) => tablets.reduce((total, dose) => total + each(dose), 0);
  reason('lowest-level-follows-stabilizer', {
    stabilizer: water.cyanuricAcid,
    lowestLevel: lowestLevel(water.cyanuricAcid, stabilized),
  });

  const free = choice.evenings.length > 0 && choice.visits > 0;
  if (tablets.length > 0)
    reason('tablets-carry', {
      tablets: sum(({ amount }) => amount),
      rise: sum(({ rise }) => rise),
      stabilizer: sum(({ effect }) => effect?.change ?? 0),
    });
  else if (options.noTablets)
    reason(options.noTablets, { stabilizer: water.cyanuricAcid, upper: pool.stabilizerBand[1], pH: water.pH });
  else if (free) reason('no-tablets-better-without');

  const fast = doses.filter(({ form }) => form !== 'tablet');
  const product = fast[0];
  if (product)
    reason('fast-closes-gap', {
      form: product.form,
      evenings: fast.length,
      rise: fast.reduce((total, { rise }) => total + rise, 0),
    });
  else if (options.fast.length === 0) reason('no-fast-on-shelf');
  else if (free) reason('nothing-fast-needed');
  if (cheapest(plan)) reason('cheaper-than');
  return reasons;
}

/** Whether the plan holds its limits, and every other way that does costs more money. */
function cheapest({ broken, alternatives, doses, money }: Explained): boolean {
  const others = alternatives.filter(({ feasible, money: other }) => feasible && other !== money);
  return doses.length > 0 && broken.length === 0 && others.length > 0 && others.every((other) => other.money > money);
}

/** What to mind with this water and this plan. */
export function cautionsOf({ doses, options, choice }: Explained, context: PlanContext): Fact[] {
  const cautions: Fact[] = [...options.cautions];
  const caution = (code: CautionCode, figures: Omit<Fact, 'code'> = {}) => cautions.push({ code, ...figures });
  const { start, scenario } = context;
  const { water } = start;
  const { pool } = scenario;
  if (water.pH < limits.pHRangeLow.value || water.pH > limits.pHRangeHigh.value)
    caution('pH-out-of-range', { pH: water.pH });
  if ((water.combinedChlorine ?? 0) > limits.combinedChlorineAct.value)
    caution('combined-chlorine-high', { combinedChlorine: water.combinedChlorine ?? 0 });
  if (water.freeChlorine > pool.swimLimit)
    caution('free-chlorine-over-swim-limit', { freeChlorine: water.freeChlorine, swimLimit: pool.swimLimit });
  const [low, high] = surfaceRanges[pool.surface].calciumHardness;
  if (start.measuredAt.calciumHardness !== undefined && (water.calciumHardness < low || water.calciumHardness > high))
    caution('hardness-outside-surface-range', {
      calciumHardness: water.calciumHardness,
      low,
      high,
      index: saturationIndex(water),
    });
  const dark = doses.some(
    ({ at, form }) =>
      form !== 'tablet' && choice.evenings.some((evening) => evening.afterDark && evening.at === Date.parse(at)),
  );
  if (dark) caution('dose-after-dark');
  for (const id of new Set(doses.flatMap(({ product, toBuy }) => (product !== null && toBuy ? [product] : []))))
    caution('stock-short', { product: id });
  if (pool.volumeEstimated) caution('volume-estimated', { volume: pool.volume });
  for (const quantity of ['totalAlkalinity', 'calciumHardness', 'cyanuricAcid'] as const)
    if (start.measuredAt[quantity] === undefined) caution('water-values-assumed', { quantity, value: water[quantity] });
  return cautions;
}
