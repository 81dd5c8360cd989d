import { dayOf } from '@/lib/calendar/household-day';
import { toOffsetIso } from '@/lib/calendar/wall-time';
import { contentsPerUnit } from '@/lib/chemistry';
import { CYANURIC_ACID_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { riseOf, type WeekDose } from '@/lib/projection/events';
import { integrateWeek } from '@/lib/projection/integrate';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Burden, Cost } from '@/lib/schemas/plan';
import { kilogramsOf } from './alternatives';
import type { DoseReason } from './codes';
import type { PlanContext } from './context';
import { costOf, type Evaluated } from './cost';
import { measuresToBuy } from './draft';
import { isGeneric } from './generic-products';
import { priceOf, tabletFacts } from './product-facts';
import { weights } from './weights';
import { wishedProduct } from './wishes';

/** Doses that stand in a plan as they were wished, and what they add to its burdens. */
export type Wished = { doses: PlannedDose[]; burden: Pick<Burden, 'money' | 'visits' | 'kilograms'> };

/** The wished doses of a context as a plan names them; what is beyond the shelf is to buy. */
export function wishedIn({ wishes, wished, scenario, median }: PlanContext): Wished {
  const { volume } = median.setting.parameters;
  const used = new Map<string, number>();
  const money: number[] = [];
  const kilograms: number[] = [];
  const doses = wishes.doses.flatMap((wish, index): PlannedDose[] => {
    const product = wishedProduct(wish, scenario)!;
    const { substance } = product;
    // Of a blend nothing could be reckoned: it was refused before.
    if (substance === 'other') return [];
    const { contents, amount } = contentsOf(wished[index]!);
    const stabilizer = contents.cyanurate * amount * CYANURIC_ACID_MILLIGRAMS_PER_MOLE;
    used.set(product.id, (used.get(product.id) ?? 0) + amount);
    money.push((priceOf(product) * amount) / 1000);
    const dose: PlannedDose = {
      at: toOffsetIso(wished[index]!.at, scenario.pool.timeZone),
      product: isGeneric(product) ? null : product.id,
      toBuy: isGeneric(product) || used.get(product.id)! > product.stock + 1e-9,
      substance,
      form: product.form,
      amount: wish.amount,
      unit: wish.unit,
      rise: riseOf(contents, amount, volume),
      ...(stabilizer > 0
        ? { effect: { quantity: 'cyanuricAcid', change: stabilizer / (scenario.pool.volume * 1000) } }
        : {}),
      reason: 'wished' satisfies DoseReason,
    };
    kilograms.push(kilogramsOf(dose, tabletFacts(product)));
    return [dose];
  });
  const days = new Set(doses.map(({ at }) => dayOf(Date.parse(at), scenario.pool.timeZone)));
  return { doses, burden: { money: sum(money), visits: days.size, kilograms: sum(kilograms) } };
}

/** The cost of a plan with what was wished: its products and visits, and undoing what it leaves behind. */
export function costWithWished(plan: Evaluated, { burden, doses }: Wished, context: PlanContext): Cost {
  if (doses.length === 0) return plan.cost;
  const { forcing, median, given, wished, scenario } = context;
  const others = given.filter((dose) => !wished.includes(dose));
  const undosed = integrateWeek(forcing, median.start, others, median.setting);
  const cost = costOf(plan.draft, plan.choice, plan.median, plan.courses, plan.middle, { ...context, undosed });
  const errand = doses.some(({ toBuy }) => toBuy) && measuresToBuy(plan.draft) === 0 ? weights.errand : 0;
  const money = scenario.preferences.money * burden.money;
  const visits = scenario.preferences.evenings * (weights.visit * burden.visits + errand);
  return { ...cost, money: cost.money + money, visits: cost.visits + visits, total: cost.total + money + visits };
}

/** What a dose brings by the gram or mL, and how much of it. */
function contentsOf(dose: WeekDose) {
  if (dose.kind === 'dose') return dose;
  const { contents, strength, count, tabletMass } = dose.load;
  return { contents: contents ?? contentsPerUnit({ substance: 'trichlor', strength }), amount: count * tabletMass };
}

function sum(values: readonly number[]): number {
  return values.reduce((total, value) => total + value, 0);
}
