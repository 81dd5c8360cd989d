import { dayOf } from '@/lib/calendar/household-day';
import { contentsPerUnit } from '@/lib/chemistry';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Scenario } from '@/lib/schemas/scenario';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import { fastChlorineCap } from '@/lib/standards/caps';
import { genericProducts } from '@/lib/standards/generic-products';
import { limits } from '@/lib/standards/limits';
import { strengthOnDay } from '@/lib/storage/liquid-strength';

const ROUNDING = 1e-6;
const HOUR = 3_600_000;
const CHLORINE_GRAMS_PER_MOLE = 70.906;
const acids: readonly string[] = ['hydrochloric-acid', 'sodium-bisulfate'];

type Fast = keyof typeof fastChlorineCap;
type Visit = { at: string; substance: string; amount: number; rise: number; product: ShelfProduct | undefined };

/** What may go in beyond its cap on a treatment evening: the likely range alone limits it. */
const ofTreatment: readonly string[] = ['calcium-hypochlorite', 'sodium-hypochlorite'];

/** What is wrong between doses: too near to each other or to what was given, too much chlorine in one evening. */
export function eveningFaults(doses: readonly PlannedDose[], scenario: Scenario, treatmentEvening: boolean): string[] {
  const { shelf, given, pool } = scenario;
  const productOf = (id: string | null) => shelf.find((product) => product.id === id);
  const planned = doses.map((dose): Visit => ({ ...dose, product: productOf(dose.product) }));
  const before = given.map(({ at, product: id, amount }): Visit => {
    const product = productOf(id);
    return { at, substance: product?.substance ?? 'other', amount, rise: 0, product };
  });
  const tooNear = planned.flatMap((visit, index) =>
    [...planned.slice(index + 1), ...before].flatMap((other) => gapFaults(visit, other)),
  );
  const days = new Set(planned.map(({ at }) => dayOf(Date.parse(at), pool.timeZone)));
  const tooMuch = [...days].flatMap((day) => {
    const shares = [...planned, ...before]
      .filter(({ at }) => dayOf(Date.parse(at), pool.timeZone) === day)
      .filter(({ substance }) => !treatmentEvening || !ofTreatment.includes(substance))
      .map((visit) => shareOfCap(visit, scenario));
    const planning = planned.some(
      (visit) => isFast(visit.substance) && dayOf(Date.parse(visit.at), pool.timeZone) === day,
    );
    const sum = shares.reduce((total, share) => total + share, 0);
    return planning && sum > 1 + ROUNDING ? [`more chlorine on ${day} than one evening may add`] : [];
  });
  return [...tooNear, ...tooMuch];
}

function gapFaults(visit: Visit, other: Visit): string[] {
  const apart = Math.abs(Date.parse(visit.at) - Date.parse(other.at)) / HOUR;
  if (apart >= limits.acidToChlorineGap.value) return [];
  const acid = acids.includes(visit.substance) || acids.includes(other.substance);
  const chlorine = isChlorine(visit.substance) || isChlorine(other.substance);
  return [acid && chlorine ? 'chlorine within 4 h of acid' : 'two products in one visit'];
}

/** Free chlorine that a fast dose adds, as a share of what one evening may add of it: the larger of said and reckoned. */
function shareOfCap({ at, substance, amount, rise, product }: Visit, { pool }: Scenario): number {
  if (!isFast(substance)) return 0;
  const printed = product?.strength ?? genericProducts[substance].strength;
  const strength =
    product?.boughtOn !== undefined && substance === 'sodium-hypochlorite'
      ? strengthOnDay(
          { strength: printed, boughtOn: product.boughtOn, storedAt: product.storedAt },
          dayOf(Date.parse(at), pool.timeZone),
        )
      : printed;
  const moles = contentsPerUnit({ substance, strength }).freeChlorine * amount;
  return Math.max(rise, (moles * CHLORINE_GRAMS_PER_MOLE) / pool.volume) / fastChlorineCap[substance].value;
}

function isFast(substance: string): substance is Fast {
  return substance in fastChlorineCap;
}

function isChlorine(substance: string): boolean {
  return isFast(substance) || substance === 'trichlor';
}
