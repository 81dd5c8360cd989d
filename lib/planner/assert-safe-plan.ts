import { dayOf } from '@/lib/calendar/household-day';
import { intervalsOfDay, parseInstant } from '@/lib/calendar/wall-time';
import { contentsPerUnit } from '@/lib/chemistry';
import { AppError } from '@/lib/errors';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import { fastChlorineCap, tabletCap } from '@/lib/standards/caps';
import { limits } from '@/lib/standards/limits';
import { dissolveFirstSurfaces } from '@/lib/standards/surface-ranges';

const ROUNDING = 1e-6;
const HOUR = 3_600_000;
const chlorines: readonly string[] = ['trichlor', 'dichlor', 'calcium-hypochlorite', 'sodium-hypochlorite'];
const acids: readonly string[] = ['hydrochloric-acid', 'sodium-bisulfate'];

/**
 * The safety net: written without the search's own arithmetic, run after every plan, it refuses and never repairs.
 * Refused are: projected p90 above 10 mg/L once something is added; more than the caps of one evening or one week; chlorine
 * within 4 h of acid; anything in swim hours or before now; two products in one visit; tablets without a feeder of their
 * ingredient or over its capacity; granules against their label or the surface; more than the shelf holds unless marked to
 * buy; a volume outside 1 to 1000 m3; figures that are not finite.
 *
 * @throws AppError plan-refused, naming each fault
 */
export function assertSafePlan(scenario: Scenario, plan: WeekPlan): void {
  const faults = [
    ...figureFaults(scenario, plan),
    ...plan.doses.flatMap((dose) => doseFaults(dose, scenario)),
    ...visitFaults(plan.doses),
    ...tabletFaults(plan.doses, scenario),
    ...stockFaults(plan.doses, scenario),
    ...projectionFaults(plan),
  ];
  if (faults.length > 0) throw new AppError('plan-refused', `The plan was refused: ${faults.join('; ')}.`);
}

function figureFaults({ pool }: Scenario, plan: WeekPlan): string[] {
  const faults: string[] = [];
  if (!(pool.volume >= 1 && pool.volume <= 1000)) faults.push(`volume ${pool.volume} m3`);
  const { projection, cost } = plan;
  const figures = [
    ...plan.doses.flatMap(({ amount, rise }) => [amount, rise]),
    ...(cost ? Object.values(cost) : []),
    ...(projection
      ? [projection.freeChlorine, projection.pH, projection.cyanuricAcid].flatMap(({ p10, p50, p90 }) => [
          ...p10,
          ...p50,
          ...p90,
        ])
      : []),
  ];
  if (!figures.every(Number.isFinite)) faults.push('a figure is not finite');
  return faults;
}

function doseFaults(dose: PlannedDose, scenario: Scenario): string[] {
  const { pool } = scenario;
  const faults: string[] = [];
  const at = parseInstant(dose.at);
  const product = productOf(dose, scenario);
  if (at === undefined) return [`no instant: ${dose.at}`];
  if (scenario.now !== undefined && at < parseInstant(scenario.now)!) faults.push(`${dose.substance} before now`);
  if (
    intervalsOfDay([pool.swimHours], dayOf(at, pool.timeZone), pool.timeZone).some(
      ({ from, to }) => at >= from && at < to,
    )
  )
    faults.push(`${dose.substance} in swim hours`);
  if (!product && !dose.toBuy) faults.push(`${dose.substance} is not on the shelf`);
  if (product && product.substance !== dose.substance) faults.push(`${product.id} is not ${dose.substance}`);

  const cap =
    dose.substance in fastChlorineCap ? fastChlorineCap[dose.substance as keyof typeof fastChlorineCap] : undefined;
  const rise = Math.max(dose.rise, labelledRise(dose, product, pool.volume));
  if (cap && rise > cap.value + ROUNDING)
    faults.push(`${dose.substance} raises chlorine by ${rise.toPrecision(3)} mg/L`);
  if (dose.substance === 'calcium-hypochlorite' && product) {
    const dissolves = product.labelWay === 'dissolve';
    const poured = product.labelWay === 'broadcast' && !dissolveFirstSurfaces.includes(pool.surface);
    if (!dissolves && !poured) faults.push(`${product.id} against its label`);
  }
  return faults;
}

/** Free chlorine that a dose adds if liquid lost nothing; for a product to buy, the dose's own figure stands [mg/L]. */
function labelledRise(
  { substance, amount, unit }: PlannedDose,
  product: ShelfProduct | undefined,
  volume: number,
): number {
  if (!product?.strength || unit === 'tablet' || substance === 'sodium-hypochlorite') return 0;
  return (contentsPerUnit({ substance, strength: product.strength }).freeChlorine * amount * 70.906) / volume;
}

function visitFaults(doses: readonly PlannedDose[]): string[] {
  return doses.flatMap((dose, index) =>
    doses.slice(index + 1).flatMap((other) => {
      const apart = Math.abs(Date.parse(dose.at) - Date.parse(other.at)) / HOUR;
      const mixed = chlorines.includes(dose.substance) !== chlorines.includes(other.substance);
      const acid = acids.includes(dose.substance) || acids.includes(other.substance);
      if (mixed && acid && apart < limits.acidToChlorineGap.value) return ['chlorine within 4 h of acid'];
      return apart < limits.acidToChlorineGap.value ? ['two products in one visit'] : [];
    }),
  );
}

function tabletFaults(doses: readonly PlannedDose[], scenario: Scenario): string[] {
  const { pool, shelf, reading } = scenario;
  const tablets = doses.filter(({ form }) => form === 'tablet');
  if (tablets.length === 0) return [];
  const faults: string[] = [];
  if (pool.feeder.kind === 'none' || pool.feeder.ingredient !== 'trichlor')
    faults.push('tablets without a feeder for them');
  if ([reading].flat().every(({ cyanuricAcid }) => cyanuricAcid === undefined))
    faults.push('tablets though stabilizer was never measured');
  let mass = 0;
  let chlorine = 0;
  let count = 0;
  for (const dose of tablets) {
    const product = shelf.find(({ id }) => id === dose.product);
    const tabletMass = product?.tabletMass ?? 227;
    count += dose.amount;
    mass += dose.amount * tabletMass;
    chlorine += (dose.amount * tabletMass * (product?.strength ?? 90)) / 100;
    if (!Number.isInteger(dose.amount)) faults.push('a broken tablet');
  }
  if (count > pool.feeder.capacity) faults.push(`${count} tablets in a feeder for ${pool.feeder.capacity}`);
  if (mass > (pool.volume / tabletCap.waterPerTablet) * tabletCap.tabletMass + ROUNDING)
    faults.push('too many tablets for the water');
  // Trichlor leaves 0.607 mg/L of stabilizer for each mg/L of chlorine: 129.074 / (3 * 70.906).
  const stabilizer = ((chlorine / pool.volume) * 129.074) / (3 * 70.906);
  if (stabilizer > tabletCap.stabilizerRise + ROUNDING) faults.push('tablets raise stabilizer too much');
  return faults;
}

function stockFaults(doses: readonly PlannedDose[], { shelf }: Scenario): string[] {
  return shelf.flatMap((product) => {
    const used = doses
      .filter(({ product: id, toBuy }) => id === product.id && !toBuy)
      .reduce((sum, { amount, unit }) => sum + amount * (unit === 'tablet' ? (product.tabletMass ?? 227) : 1), 0);
    return used > product.stock * (1 + ROUNDING) ? [`more ${product.id} than the shelf holds`] : [];
  });
}

function projectionFaults({ projection, doses, hours }: WeekPlan): string[] {
  if (doses.length === 0) return [];
  if (!projection) return ['doses without a projection'];
  const first = Math.min(...doses.map(({ at }) => Date.parse(at)));
  const over = projection.freeChlorine.p90.some(
    (value, hour) => Date.parse(hours[hour]!) >= first && value > limits.freeChlorineMaximum.value,
  );
  return over ? ['free chlorine may pass 10 mg/L'] : [];
}

function productOf({ product }: PlannedDose, { shelf }: Scenario): ShelfProduct | undefined {
  return shelf.find(({ id }) => id === product);
}
