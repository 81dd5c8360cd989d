import { parseInstant } from '@/lib/calendar/wall-time';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { Scenario } from '@/lib/schemas/scenario';
import { tabletCap } from '@/lib/standards/caps';
import { genericProducts } from '@/lib/standards/generic-products';

const ROUNDING = 1e-6;
const HOUR = 3_600_000;
/** Trichlor leaves 0.607 mg/L of stabilizer for each mg/L of chlorine: 129.074 / (3 * 70.906). */
const STABILIZER_PER_CHLORINE = 129.074 / (3 * 70.906);

/** What is wrong with the tablets of a week; those given in the days before its first ones count to its caps. */
export function tabletFaults(doses: readonly PlannedDose[], { pool, shelf, reading, given }: Scenario): string[] {
  const planned = doses.filter(({ form }) => form === 'tablet');
  if (planned.length === 0) return [];
  const faults: string[] = [];
  if (pool.feeder.kind === 'none' || pool.feeder.ingredient !== 'trichlor')
    faults.push('tablets without a feeder for them');
  if (planned.some(({ substance }) => substance !== 'trichlor')) faults.push('tablets of another ingredient');
  if ([reading].flat().every(({ cyanuricAcid }) => cyanuricAcid === undefined))
    faults.push('tablets though stabilizer was never measured');
  const newestFirst = [reading].flat().toSorted((a, b) => Date.parse(b.takenAt) - Date.parse(a.takenAt));
  const sour = middle(
    newestFirst.find(({ pH, freeChlorine }) => pH !== undefined && (middle(freeChlorine) ?? 0) <= 10)?.pH,
  );
  if (sour !== undefined && sour < 7) faults.push('tablets at a pH under 7.0');
  const stabilizers = newestFirst.filter(({ cyanuricAcid }) => cyanuricAcid !== undefined);
  if (stabilizers.length > 0 && stabilizers.every(({ method }) => method === 'strip'))
    faults.push('tablets though stabilizer was read on strips alone');
  const stabilizer = middle(stabilizers[0]?.cyanuricAcid);
  // What the pool has taught may move it a little from what was read.
  if (stabilizer !== undefined && stabilizer > pool.stabilizerBand[1] + 10)
    faults.push('tablets though stabilizer is above its band');
  if (planned.some(({ amount, unit }) => unit !== 'tablet' || !Number.isInteger(amount)))
    faults.push('a broken tablet');

  const since = Math.min(...planned.map(({ at }) => Date.parse(at))) - tabletCap.countedFor * HOUR;
  const productOf = (id: string | null) => shelf.find((product) => product.id === id);
  const before = given.filter(({ at, product }) => productOf(product)?.form === 'tablet' && parseInstant(at)! >= since);
  const usual = genericProducts.trichlor;
  let mass = 0;
  let chlorine = 0;
  for (const { product: id, amount } of [...planned, ...before]) {
    const product = productOf(id);
    const grams = amount * (product?.tabletMass ?? usual.tabletMass);
    mass += grams;
    chlorine += (grams * (product?.strength ?? usual.strength)) / 100;
  }
  const count = planned.reduce((sum, { amount }) => sum + amount, 0);
  if (count > pool.feeder.capacity) faults.push(`${count} tablets in a feeder for ${pool.feeder.capacity}`);
  if (mass > (pool.volume / tabletCap.waterPerTablet) * tabletCap.tabletMass + ROUNDING)
    faults.push('too many tablets for the water');
  if ((chlorine / pool.volume) * STABILIZER_PER_CHLORINE > tabletCap.stabilizerRise + ROUNDING)
    faults.push('tablets raise stabilizer too much');
  return faults;
}

function middle(value: number | { low: number; high: number } | undefined): number | undefined {
  return typeof value === 'object' ? (value.low + value.high) / 2 : value;
}
