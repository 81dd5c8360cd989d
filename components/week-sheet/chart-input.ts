import type { ChartDose } from '@/components/charts/chart-doses';
import { glyphOf } from '@/components/charts/chart-doses';
import type { ChartTest } from '@/components/charts/test-marks';
import type { CurveQuantity } from '@/components/charts/water-curve';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { RecordedReading } from '@/lib/schemas/reading';
import type { ReadingMethod } from '@/lib/schemas/reading-kinds';
import { doseInstant } from './dose-state';
import { instantOf } from './sheet-times';

/** What the charts draw of a dose; the words come from whoever knows the language. */
export function chartDoses(
  doses: readonly PlanDose[],
  words: { gainOf: (dose: PlanDose) => string | undefined; amountAndProduct: (dose: PlanDose) => string },
): ChartDose[] {
  return doses
    .filter(({ status }) => status !== 'skipped')
    .map((dose) => ({
      id: dose.id,
      at: doseInstant(dose),
      glyph: glyphOf(dose.form),
      moves: movedBy(dose),
      given: dose.status !== 'planned',
      gain: words.gainOf(dose),
      words: words.amountAndProduct(dose),
    }));
}

/** Chlorine products move free chlorine; of the others only what moves pH or stabilizer has a curve here. */
function movedBy({ substance, effect }: PlanDose): CurveQuantity | undefined {
  if (chlorineSubstances.has(substance)) return 'freeChlorine';
  return effect?.quantity === 'pH' || effect?.quantity === 'cyanuricAcid' ? effect.quantity : undefined;
}

const chlorineSubstances: ReadonlySet<string> = new Set([
  'trichlor',
  'dichlor',
  'calcium-hypochlorite',
  'sodium-hypochlorite',
]);

/** Readings of one quantity as marks: a dot with its method's exactness, or the interval that a strip gave. */
export function chartTests(readings: readonly RecordedReading[], quantity: CurveQuantity): ChartTest[] {
  return readings.flatMap(({ id, takenAt, method, values }) => {
    const value = values[quantity];
    if (value === undefined) return [];
    const at = instantOf(takenAt);
    if (typeof value === 'number') return [{ id, at, value, spread: methodSpread(quantity, method, value) }];
    if (value.low === value.high)
      return [{ id, at, value: value.low, spread: methodSpread(quantity, method, value.low) }];
    const middle = (value.low + value.high) / 2;
    return [{ id, at, value: middle, spread: value.high - middle, between: value }];
  });
}

/** One sigma of a method (engine.md 2): how long a dot's whisker is. */
function methodSpread(quantity: CurveQuantity, method: ReadingMethod, value: number): number {
  switch (quantity) {
    case 'freeChlorine':
      return Math.max(0.2, value * (method === 'strip' ? 0.3 : 0.1));
    case 'pH':
      return method === 'strip' ? 0.2 : 0.1;
    case 'cyanuricAcid':
      return value * { strip: 0.25, 'drop-kit': 0.15, slip: 0.1 }[method];
  }
}
