import { toOffsetIso } from '@/lib/calendar/wall-time';
import { contentsPerUnit } from '@/lib/chemistry';
import { CYANURIC_ACID_MILLIGRAMS_PER_MOLE } from '@/lib/chemistry/molar-masses';
import { riseOf } from '@/lib/projection/events';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { PlanContext } from './context';
import type { DoseReason } from './codes';
import type { Choice, Draft } from './draft';
import { isGeneric } from './generic-products';
import { riseOfFast } from './products';

export const QUICK_RAISE = 2.5;

/**
 * The doses of a draft as a plan names them, in order of time. From the dose on that the shelf no longer holds, they are
 * marked to buy.
 *
 * @param halvedEvening that of a halved first dose
 */
export function plannedDoses(
  draft: Draft,
  { tablets, evenings }: Choice,
  { scenario, median }: PlanContext,
  halvedEvening: number | null = null,
): PlannedDose[] {
  const { pool } = scenario;
  // Chlorine spreads over what the pool behaves as if it held; everything else over what was measured.
  const { volume } = median.setting.parameters;
  const { fast } = draft;
  const isoAt = (evening: number) => toOffsetIso(evenings[evening]!.at, pool.timeZone);
  const doses: PlannedDose[] = [];
  draft.tablets.forEach((count, evening) => {
    if (count === 0 || !tablets) return;
    const { product, tabletMass, strength } = tablets;
    const contents = contentsPerUnit({ substance: 'trichlor', strength });
    const stabilizer = contents.cyanurate * count * tabletMass * CYANURIC_ACID_MILLIGRAMS_PER_MOLE;
    doses.push({
      at: isoAt(evening),
      product: product.id,
      toBuy: false,
      substance: 'trichlor',
      form: 'tablet',
      amount: count,
      unit: 'tablet',
      rise: riseOf(contents, count * tabletMass, volume),
      effect: { quantity: 'cyanuricAcid', change: stabilizer / (pool.volume * 1000) },
      reason: (halvedEvening === evening ? 'first-dose-halved' : 'slow-supply') satisfies DoseReason,
    });
  });
  let used = 0;
  draft.measures.forEach((measures, evening) => {
    if (measures === 0 || !fast) return;
    const amount = measures * fast.measure;
    used += amount;
    const rise = riseOfFast(fast, amount, evenings[evening]!.at, volume);
    const usual: DoseReason = rise >= QUICK_RAISE ? 'quick-raise' : 'closes-gap';
    const reason: DoseReason = evening === halvedEvening ? 'first-dose-halved' : usual;
    doses.push({
      at: isoAt(evening),
      product: isGeneric(fast.product) ? null : fast.product.id,
      toBuy: isGeneric(fast.product) || used > fast.stock + 1e-9,
      substance: fast.substance,
      form: fast.form,
      amount,
      unit: fast.form === 'liquid' ? 'mL' : 'g',
      rise,
      reason,
    });
  });
  return doses.sort((a, b) => Date.parse(a.at) - Date.parse(b.at));
}
