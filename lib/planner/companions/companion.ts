import { parseInstant } from '@/lib/calendar/wall-time';
import { addDose } from '@/lib/chemistry';
import { analysisAt } from '@/lib/projection';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import { MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import { ledgerAt } from '@/lib/projection/integrate';
import type { PlannedDose } from '@/lib/schemas/dose';
import { companionCap } from '@/lib/standards/caps';
import { retestHours } from '@/lib/standards/companions';
import type { PlanContext } from '../context';
import type { ByMedian } from '../cost';
import { priceOf } from '../product-facts';
import type { Options } from '../products';
import { sumOf } from '../draft';
import { companionAmount } from './amount';
import { everGiven, productFor } from './companion-product';
import { momentOf } from './moment';
import { type CompanionNeed, companionNeeds, type CompanionSubstance } from './need';
import { plannedCompanion } from './planned';

/** A dose beside chlorine: how a plan names it, how the projection takes it, what it costs, and when to test again [ms]. */
export type Companion = { planned: PlannedDose; dose: WeekDose; money: number; retestAt: number };

/**
 * What a plan's week needs beside chlorine, and a dose for each need that it leaves a moment for, the most urgent first. A
 * week holds one at most, with a test before the next (care rules, part 4).
 *
 * @param plan a good week of chlorine without it
 */
export function companionsOf(
  plan: ByMedian,
  { context, options }: { context: PlanContext; options: Options },
): { needs: CompanionNeed[]; companions: Companion[] } {
  const { scenario, start } = context;
  const needs = companionNeeds({
    pool: scenario.pool,
    water: start.water,
    pH: plan.median.pH,
    measured: (quantity) => start.measuredAt[quantity] !== undefined,
    pHRead: start.measuredAt.pH === start.takenAt,
    tabletsLead: sumOf(plan.draft.tablets) > 0 || context.wished.some(({ kind }) => kind === 'tablets'),
    tabletsPossible: options.tabletsMayBe,
  });
  if (untested(context) || plan.choice.visits < 2) return { needs, companions: [] };
  return { needs, companions: needs.flatMap((need) => companionFor(need, plan, context) ?? []) };
}

function companionFor(need: CompanionNeed, plan: ByMedian, context: PlanContext): Companion | null {
  const { scenario, start } = context;
  const { pool } = scenario;
  const product = productFor(need.substances, scenario);
  if (!product) return null;
  const at = momentOf(need, product.substance, plan, context);
  if (at === null) return null;
  const hour = Math.floor((at - start.takenAt) / MILLISECONDS_PER_HOUR);
  const water = analysisAt(ledgerAt(plan.median, hour), plan.median.pH[hour]!);
  const acid = need.reason === 'lowers-pH';
  const amount = companionAmount(need, product, water, {
    volume: pool.volume,
    pHError: start.errors.pH,
    halved: (pool.volumeEstimated && scenario.given.length === 0) || (acid && !everGiven(product.substance, scenario)),
  });
  if (amount === 0) return null;
  const { substance } = product;
  const dose = { substance, amount, strength: product.strength ?? companionCap[substance].strength };
  const after = addDose(water, pool.volume, dose);
  return {
    planned: plannedCompanion(product, {
      ...{ at, amount, reason: need.reason, timeZone: pool.timeZone },
      effect: { quantity: need.quantity, change: after[need.quantity] - water[need.quantity] },
    }),
    dose: weekDose(at, dose, pool.volume),
    money: (priceOf(product) * amount) / 1000,
    retestAt: at + retestHours[substance] * MILLISECONDS_PER_HOUR,
  };
}

/** Whether a companion has gone in since the water was last tested long enough after it. */
function untested({ scenario, start }: PlanContext): boolean {
  const newest = Math.max(start.measuredAt.pH ?? 0, start.measuredAt.totalAlkalinity ?? 0);
  return scenario.given.some(({ at, product: id }) => {
    const substance = scenario.shelf.find((product) => product.id === id)?.substance;
    const hours = substance && retestHours[substance as CompanionSubstance];
    return hours !== undefined && parseInstant(at)! + hours * MILLISECONDS_PER_HOUR > newest;
  });
}
