import { AppError } from '@/lib/errors';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import { limits } from '@/lib/standards/limits';
import { companionFaults } from './companion-faults';
import { doseFaults } from './dose-faults';
import { eveningFaults } from './evening-faults';
import { tabletFaults } from './tablet-faults';

/**
 * The safety net: written without the search's own arithmetic, run after every plan, it refuses and never repairs.
 * Refused are: projected p90 above 10 mg/L once something is added; more than the caps of one evening or one week, what was
 * given counted in; chlorine within 4 h of acid; two doses beside chlorine without a test between, calcium within a day of
 * a carbonate, too much acid, soda in hard water; anything in swim hours or before now; two products in one visit; tablets
 * without a feeder of their ingredient or over its capacity; granules against their label or the surface; more than the
 * shelf holds unless marked to buy; a volume outside 1 to 1000 m3; figures that are not finite. The ways that a plan was
 * compared with are held to the same.
 *
 * @param treatmentEvening whether a situation treats the water: granules and liquid may then raise to 10 mg/L in all
 * @throws AppError plan-refused, naming each fault
 */
export function assertSafePlan(
  scenario: Scenario,
  plan: WeekPlan,
  { treatmentEvening = false }: { treatmentEvening?: boolean } = {},
): void {
  const faults = [
    ...figureFaults(scenario, plan),
    ...dosesFaults(plan.doses, scenario, treatmentEvening),
    ...projectionFaults(plan),
    ...companionFaults(plan, scenario),
    ...plan.alternatives.flatMap(({ kind, doses }) =>
      dosesFaults(doses, scenario).map((fault) => `${fault} (${kind} alone)`),
    ),
  ];
  if (faults.length > 0) throw new AppError('plan-refused', `The plan was refused: ${faults.join('; ')}.`);
}

function dosesFaults(doses: readonly PlannedDose[], scenario: Scenario, treatmentEvening = false): string[] {
  return [
    ...doses.flatMap((dose) => doseFaults(dose, scenario)),
    ...eveningFaults(doses, scenario, treatmentEvening),
    ...tabletFaults(doses, scenario),
    ...stockFaults(doses, scenario),
  ];
}

function figureFaults({ pool }: Scenario, plan: WeekPlan): string[] {
  const faults: string[] = [];
  if (!(pool.volume >= 1 && pool.volume <= 1000)) faults.push('a volume outside 1 to 1000 m3');
  if (!isFinite(plan)) faults.push('a figure is not finite');
  return faults;
}

/** Whether every number in a plan, however deep, is finite. */
function isFinite(value: unknown): boolean {
  if (typeof value === 'number') return Number.isFinite(value);
  return typeof value !== 'object' || value === null || Object.values(value).every(isFinite);
}

function stockFaults(doses: readonly PlannedDose[], { shelf }: Scenario): string[] {
  return shelf.flatMap((product) => {
    const used = doses
      .filter(({ product: id, toBuy }) => id === product.id && !toBuy)
      .reduce((sum, { amount, unit }) => sum + amount * (unit === 'tablet' ? (product.tabletMass ?? 227) : 1), 0);
    return used > product.stock + 1e-6 ? [`more ${product.id} than the shelf holds`] : [];
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
