import { saturationIndex } from '@/lib/chemistry';
import type { Alternative, BrokenLimit, Fact } from '@/lib/schemas/plan';
import type { PlannedDose } from '@/lib/schemas/dose';
import { codeMinimum, limits, lowestLevel } from '@/lib/standards/limits';
import { surfaceRanges } from '@/lib/standards/surface-ranges';
import { type CautionCode, type DoseReason, isCompanionReason, type LimitCode, type ReasonCode } from './codes';
import type { CompanionNeed } from './companions/need';
import type { PlanContext } from './context';
import { doseEvenings, isLastLight } from './evenings';
import type { Choice } from './draft';
import type { Options } from './products';
import { waterExchange } from './water-exchange';
import { isEmptyWish } from './wishes';

export const FEW_OPEN_HOURS = 0.9;

type Explained = {
  doses: readonly PlannedDose[];
  /** Those of chlorine. */
  chlorine: readonly PlannedDose[];
  /** What is needed beside chlorine and has to wait. */
  waiting: CompanionNeed | null;
  choice: Choice;
  options: Options;
  alternatives: readonly Alternative[];
  broken: readonly BrokenLimit[];
  openShare: number;
  /** What the products of the plan cost, and the whole of what it costs. */
  money: number;
  total: number;
};

/** Why this plan, as codes with their figures; what the person must know first comes first. */
export function reasonsOf(plan: Explained, context: PlanContext): Fact[] {
  const { doses, chlorine, choice, options, openShare } = plan;
  const reasons: Fact[] = [];
  const reason = (code: ReasonCode, figures: Omit<Fact, 'code'> = {}) => reasons.push({ code, ...figures });
  const { water } = context.start;
  const { pool, preferences } = context.scenario;
  const exchange = waterExchange(water.cyanuricAcid, pool);
  if (exchange) reason('replace-water-first', { ...exchange });
  if (openShare < FEW_OPEN_HOURS) reason('few-open-hours', { share: openShare, visits: preferences.visits });
  if (!isEmptyWish(context.wishes)) reason('wished');
  const tablets = chlorine.filter(({ form }) => form === 'tablet');
  const stabilized = context.stabilizedProductUsed || tablets.length > 0;
  const sum = (each: (dose: PlannedDose) => number) => tablets.reduce((total, dose) => total + each(dose), 0);
  const lowest = lowestLevel(water.cyanuricAcid, stabilized);
  reason('lowest-level-follows-stabilizer', {
    stabilizer: water.cyanuricAcid,
    lowestLevel: lowest,
    sets: lowest > codeMinimum(water.cyanuricAcid, stabilized) ? 'stabilizer' : 'rules',
  });

  const fast = chlorine.filter(({ form }) => form !== 'tablet');
  const free = choice.evenings.length > 0 && choice.visits > 0;
  if (tablets.length > 0)
    reason('tablets-carry', {
      tablets: sum(({ amount }) => amount),
      rise: sum(({ rise }) => rise),
      stabilizer: sum(({ effect }) => effect?.change ?? 0),
      most: yesOrNo(sum(({ rise }) => rise) > fast.reduce((total, { rise }) => total + rise, 0)),
    });
  else if (options.noTablets)
    reason(options.noTablets, { stabilizer: water.cyanuricAcid, upper: pool.stabilizerBand[1], pH: water.pH });
  // Where the household wants none, nobody has looked whether they would be better; a halved first dose may make them so.
  else if (free && !context.wishes.noFurtherTablets && !tabletsCostLess(plan)) reason('no-tablets-better-without');

  const closes = plan.broken.every(({ limit }) => limit !== ('lowest-level' satisfies LimitCode));
  for (const form of new Set(fast.map((dose) => dose.form))) {
    const ofForm = fast.filter((dose) => dose.form === form);
    const rise = ofForm.reduce((total, dose) => total + dose.rise, 0);
    const lastLight = yesOrNo(ofForm.every(({ at }) => isLastLight(Date.parse(at), pool)));
    reason('fast-closes-gap', { form, evenings: ofForm.length, rise, closes: yesOrNo(closes), lastLight });
  }
  if (fast.length === 0 && options.fast.length === 0) reason('no-fast-on-shelf');
  else if (fast.length === 0 && free && closes) reason('nothing-fast-needed');
  for (const { reason: why, effect } of doses)
    if (effect && isCompanionReason(why)) reason(why, { quantity: effect.quantity, change: effect.change });
  if (cheapest(plan)) reason('cheaper-than');
  for (const quantity of ['totalAlkalinity', 'calciumHardness', 'cyanuricAcid'] as const)
    if (context.start.measuredAt[quantity] === undefined)
      reason('water-values-assumed', { quantity, value: water[quantity] });
  return reasons;
}

/** Whether the plan holds its limits, and every other way that does costs more money, as money is written: in hundredths. */
function cheapest({ broken, alternatives, doses, money }: Explained): boolean {
  const others = alternatives.filter((way) => way.feasible && !isSameWay(way.doses, doses));
  const hundredths = (price: number) => Math.round(price * 100);
  const cheaper = others.every((other) => hundredths(other.money) > hundredths(money));
  return doses.length > 0 && broken.length === 0 && others.length > 0 && cheaper;
}

/** Whether the week with tablets alone costs less over all. */
function tabletsCostLess({ alternatives, total }: Explained): boolean {
  return alternatives.some((way) => way.kind === 'tablets' && way.doses.length > 0 && way.total < total);
}

function isSameWay(one: readonly PlannedDose[], other: readonly PlannedDose[]): boolean {
  const written = (doses: readonly PlannedDose[]) =>
    doses.map(({ at, product, amount }) => `${at} ${product} ${amount}`).join();
  return written(one) === written(other);
}

function yesOrNo(is: boolean): 'yes' | 'no' {
  return is ? 'yes' : 'no';
}

/** What to mind with this water and this plan. */
export function cautionsOf({ doses, options, waiting }: Explained, context: PlanContext): Fact[] {
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
  if (waiting) caution('companion-waits', { reason: waiting.reason });
  const [low, high] = surfaceRanges[pool.surface].calciumHardness;
  if (start.measuredAt.calciumHardness !== undefined && (water.calciumHardness < low || water.calciumHardness > high))
    caution('hardness-outside-surface-range', {
      calciumHardness: water.calciumHardness,
      low,
      high,
      index: saturationIndex(water),
    });
  const late = doseEvenings(pool, start.takenAt, context.now).filter(({ afterDark }) => afterDark);
  const dark = doses.filter(({ at }) => late.some((evening) => evening.at === Date.parse(at)));
  if (dark.length > 0) caution('dose-after-dark', { doses: dark.length });
  for (const id of new Set(doses.flatMap(({ product, toBuy }) => (product !== null && toBuy ? [product] : []))))
    caution('stock-short', { product: id });
  const halved = doses.some(({ reason }) => reason === ('first-dose-halved' satisfies DoseReason));
  if (pool.volumeEstimated) caution('volume-estimated', { volume: pool.volume, halved: yesOrNo(halved) });
  return cautions;
}
