import { addDays, dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso, wallToInstant } from '@/lib/calendar/wall-time';
import { amountToReach, contentsPerUnit, type DoseContents } from '@/lib/chemistry';
import { analysisAt } from '@/lib/projection';
import { riseOf } from '@/lib/projection/events';
import { MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import { type Course, integrateWeek, ledgerAt } from '@/lib/projection/integrate';
import { quantile } from '@/lib/projection/quantiles';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import type { SituationKind } from '@/lib/schemas/situation';
import type { Treatment } from '@/lib/schemas/treatment';
import { limits } from '@/lib/standards/limits';
import { surfaceRanges } from '@/lib/standards/surface-ranges';
import type { CheckReason, DoseReason, ReasonCode } from './codes';
import { contextOf, type PlanContext } from './context';
import { type Evening, openEvenings } from './evenings';
import { isGeneric } from './generic-products';
import { openSwimShare } from './limits-broken';
import { needsOf } from './needs';
import { type FastOption, optionsOf } from './products';
import { projectScenario } from './project-scenario';
import { assertSafePlan } from './safety/assert-safe-plan';
import { threeFigures } from './three-figures';
import { treatmentAcid } from './treatment-acid';

/** A level this near to the aim counts as there [mg/L]: no kit tells them apart. */
export const NEAR_ENOUGH = 0.2;
/** So much over its target pH counts as there: a kit reads it no better. */
export const PH_NEAR_ENOUGH = 0.1;
/** When a morning is read after a treatment evening. */
const MORNING = '08:00';

/**
 * The week while a situation treats the water: acid first where pH is too high for it, then one dose of granules or liquid
 * on the next free evening, and a test the morning after. What comes later hangs on that test.
 *
 * The amount is {@link amountToReach} from the middle of the likely range in that hour, less where the range's high edge
 * would pass 10 mg/L, rounded down to three figures (under 1 %). Half where the volume is an estimate and nothing has gone in.
 *
 * Errors: as `planWeek`.
 */
export function treatmentWeek(scenario: Scenario, treatment: Treatment): WeekPlan {
  if (needsOf(scenario).blocking.length > 0) return projectScenario({ ...scenario, doses: [] });
  const bare = contextOf(scenario);
  const acid = treatment.pHFirst === undefined ? null : treatmentAcid(treatment.pHFirst, bare);
  const context = acid ? contextOf(scenario, { companion: acid.dose }) : bare;
  // Chlorine waits until a test finds pH low enough: acid and chlorine need a reading between them.
  const waits = treatment.pHFirst !== undefined && bare.start.water.pH > treatment.pHFirst + PH_NEAR_ENOUGH;
  const evening = waits ? undefined : openEvenings(context)[0];
  const { fast, cautions } = optionsOf(context);
  const chlorine = evening ? chlorineDose(treatment, evening, fast, context) : null;
  const doses = [acid?.planned ?? [], chlorine ?? []].flat();
  const plan = projectScenario({ ...scenario, doses });
  const result: WeekPlan = {
    ...plan,
    doses,
    checks: doses.length > 0 ? [nextCheck(doses, waits, context)] : [],
    openSwimShare: plan.projection && openSwimShare(plan.projection, doses, context),
    reasons: [{ code: 'situation-treats' satisfies ReasonCode, kind: treatment.kind }],
    cautions,
  };
  assertSafePlan(scenario, result, { treatmentEvening: treatment.evening === 'treatment' });
  return result;
}

/** The week while a situation wants nothing added: only the outlook. */
export function holdWeek(scenario: Scenario, kind: SituationKind): WeekPlan {
  const plan = projectScenario({ ...scenario, doses: [] });
  return { ...plan, reasons: [{ code: 'situation-holds' satisfies ReasonCode, kind }] };
}

function chlorineDose(
  { aim, evening: sort }: Treatment,
  { at }: Evening,
  fast: readonly FastOption[],
  context: PlanContext,
): PlannedDose | null {
  const { scenario, median, members, given, forcing } = context;
  const levels = members.map((member) =>
    levelAt(integrateWeek(forcing, member.start, given, member.setting), at, context),
  );
  const middle = quantile(
    levels.toSorted((a, b) => a - b),
    0.5,
  );
  const maximum = limits.freeChlorineMaximum.value;
  const option = optionFor(fast, context);
  if (!option) return null;
  const wanted = 'to' in aim ? aim.to : middle + aim.by;
  const target = Math.min(wanted, maximum, sort === 'ordinary' ? middle + option.capRise : maximum);
  if (target - middle < NEAR_ENOUGH) return null;

  const { volume } = median.setting.parameters;
  const hour = Math.min(
    Math.max(0, Math.floor((at - context.start.takenAt) / MILLISECONDS_PER_HOUR)),
    context.undosed.pH.length - 1,
  );
  const water = { ...analysisAt(ledgerAt(context.undosed, hour), context.undosed.pH[hour]!), freeChlorine: middle };
  const dose = option.dose(1, at);
  const contents = contentsPerUnit(dose);
  const reaching = amountToReach(water, volume, dose, { quantity: 'freeChlorine', value: target });
  const halved = scenario.pool.volumeEstimated && scenario.given.length === 0;
  const amount = threeFigures(Math.min(reaching, mostUnder(maximum, levels, contents, context)) / (halved ? 2 : 1));
  if (amount <= 0) return null;
  const usual: DoseReason =
    sort === 'treatment' && wanted >= maximum - NEAR_ENOUGH ? 'treatment-evening' : 'raise-to-limit';
  return {
    at: toOffsetIso(at, scenario.pool.timeZone),
    product: isGeneric(option.product) ? null : option.product.id,
    toBuy: isGeneric(option.product) || amount > option.stock + 1e-9,
    substance: option.substance,
    form: option.form,
    amount,
    unit: option.form === 'liquid' ? 'mL' : 'g',
    rise: riseOf(contents, amount, volume),
    reason: (halved ? 'first-dose-halved' : 'by' in aim ? 'treatment-evening' : usual) satisfies DoseReason,
  };
}

/** Granules leave calcium behind: in hard water liquid goes in where there is some; else the cheapest. */
function optionFor(fast: readonly FastOption[], { start, scenario: { pool } }: PlanContext): FastOption | undefined {
  const hard = start.water.calciumHardness >= surfaceRanges[pool.surface].calciumHardness[1];
  return (hard ? fast.find(({ form }) => form === 'liquid') : undefined) ?? fast[0];
}

/** Free chlorine of a course at an instant [mg/L], between its hours. */
function levelAt({ hourly }: Course, at: number, { start }: PlanContext): number {
  const { freeChlorine } = hourly;
  const place = (at - start.takenAt) / MILLISECONDS_PER_HOUR;
  const before = Math.min(Math.max(0, Math.floor(place)), freeChlorine.length - 1);
  const after = Math.min(before + 1, freeChlorine.length - 1);
  return freeChlorine[before]! + (place - before) * (freeChlorine[after]! - freeChlorine[before]!);
}

/** The largest amount with which the high edge of the likely range stays at or under a level, by bisection. */
function mostUnder(level: number, levels: readonly number[], contents: DoseContents, { members }: PlanContext): number {
  const rises = members.map(({ setting }) => riseOf(contents, 1, setting.parameters.volume));
  const edge = (amount: number) =>
    quantile(
      levels.map((each, member) => each + rises[member]! * amount).sort((a, b) => a - b),
      0.9,
    );
  let low = 0;
  let high = level / Math.min(...rises);
  if (edge(low) >= level) return 0;
  for (let step = 0; step < 50; step++) {
    const amount = (low + high) / 2;
    if (edge(amount) <= level) low = amount;
    else high = amount;
  }
  return low;
}

/** The morning after chlorine; after acid the same day, as soon as it shows. */
function nextCheck(
  doses: readonly PlannedDose[],
  afterAcid: boolean,
  { scenario: { pool } }: PlanContext,
): WeekPlan['checks'][number] {
  const last = Math.max(...doses.map(({ at }) => Date.parse(at)));
  const at = afterAcid
    ? last + limits.acidToChlorineGap.value * MILLISECONDS_PER_HOUR
    : wallToInstant(addDays(dayOf(last, pool.timeZone), 1), MORNING, pool.timeZone).instant;
  return { at: toOffsetIso(at, pool.timeZone), kind: 'quick', reason: 'after-treatment' satisfies CheckReason };
}
