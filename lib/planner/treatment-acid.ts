import { addDays, dayOf } from '@/lib/calendar/household-day';
import { addDose } from '@/lib/chemistry';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import { MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import type { PlannedDose } from '@/lib/schemas/dose';
import { companionCap } from '@/lib/standards/caps';
import { limits } from '@/lib/standards/limits';
import { companionWanted } from './companions/amount';
import { everGiven, productFor } from './companions/companion-product';
import { firstLight } from './companions/moment';
import { plannedCompanion } from './companions/planned';
import type { PlanContext } from './context';
import { threeFigures } from './three-figures';

/** Mornings that are looked at: somewhere in a week there is one. */
const MORNINGS = 7;

/**
 * Acid that brings pH down to where chlorine works better, on the next morning at first light; null where pH is low enough
 * already, or acid went in since the last test. By at most 0.4, the likely range not under 7.2, half of it the first time.
 *
 * @param target pH to come to
 */
export function treatmentAcid(target: number, context: PlanContext): { planned: PlannedDose; dose: WeekDose } | null {
  const { scenario, start, now, given } = context;
  const { pool } = scenario;
  const { water } = start;
  const product = productFor(['hydrochloric-acid', 'sodium-bisulfate'], scenario);
  if (water.pH <= target || !product) return null;
  if (scenario.given.some((dose) => Date.parse(dose.at) > (start.measuredAt.pH ?? 0) && isAcid(dose.product, context)))
    return null;
  const gap = limits.acidToChlorineGap.value * MILLISECONDS_PER_HOUR;
  const first = dayOf(now, pool.timeZone);
  const at = Array.from({ length: MORNINGS }, (_, index) => firstLight(addDays(first, index), context)).find(
    (morning) => morning !== null && morning >= now && given.every((dose) => Math.abs(dose.at - morning) >= gap),
  );
  if (at === undefined || at === null) return null;
  const { substance } = product;
  const halved = (pool.volumeEstimated && scenario.given.length === 0) || !everGiven(substance, scenario);
  const { wanted } = companionWanted({ reason: 'lowers-pH', quantity: 'pH', target }, product, water, {
    volume: pool.volume,
    pHError: start.errors.pH,
    halved,
  });
  const amount = threeFigures(wanted);
  if (amount <= 0) return null;
  const dose = { substance, amount, strength: product.strength ?? companionCap[substance].strength };
  return {
    planned: plannedCompanion(product, {
      ...{ at, amount, reason: 'pH-before-treatment', timeZone: pool.timeZone },
      effect: { quantity: 'pH', change: addDose(water, pool.volume, dose).pH - water.pH },
    }),
    dose: weekDose(at, dose, pool.volume),
  };
}

function isAcid(productId: string, { scenario: { shelf } }: PlanContext): boolean {
  const substance = shelf.find(({ id }) => id === productId)?.substance;
  return substance === 'hydrochloric-acid' || substance === 'sodium-bisulfate';
}
