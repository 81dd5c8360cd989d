import { toOffsetIso } from '@/lib/calendar/wall-time';
import { contentsPerUnit } from '@/lib/chemistry';
import { riseOf } from '@/lib/projection/events';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { PlanContext } from './context';
import type { DoseReason } from './codes';
import type { Choice, Draft } from './draft';
import { isGeneric } from './generic-products';
import { riseOfFast } from './products';

const QUICK_RAISE = 2.5;

/** The doses of a draft as a plan names them, in order of time; `halvedEvening` is that of a halved first dose. */
export function plannedDoses(
  draft: Draft,
  { tablets, evenings }: Choice,
  { scenario }: PlanContext,
  halvedEvening: number | null = null,
): PlannedDose[] {
  const { pool } = scenario;
  const { fast } = draft;
  const isoAt = (evening: number) => toOffsetIso(evenings[evening]!.at, pool.timeZone);
  const doses: PlannedDose[] = [];
  if (draft.tablets > 0 && tablets) {
    const { product, tabletMass, strength } = tablets;
    const contents = contentsPerUnit({ substance: 'trichlor', strength });
    doses.push({
      at: isoAt(draft.tabletEvening),
      product: isGeneric(product) ? null : product.id,
      toBuy: isGeneric(product),
      substance: 'trichlor',
      form: 'tablet',
      amount: draft.tablets,
      unit: 'tablet',
      rise: riseOf(contents, draft.tablets * tabletMass, pool.volume),
      effect: {
        quantity: 'cyanuricAcid',
        change: (contents.cyanurate * draft.tablets * tabletMass * 129.074) / pool.volume,
      },
      reason: (halvedEvening === draft.tabletEvening ? 'first-dose-halved' : 'slow-supply') satisfies DoseReason,
    });
  }
  draft.measures.forEach((measures, evening) => {
    if (measures === 0 || !fast) return;
    const amount = measures * fast.measure;
    const rise = riseOfFast(fast, amount, evenings[evening]!.at, pool.volume);
    const usual: DoseReason = rise >= QUICK_RAISE ? 'quick-raise' : 'closes-gap';
    const reason: DoseReason = evening === halvedEvening ? 'first-dose-halved' : usual;
    doses.push({
      at: isoAt(evening),
      product: isGeneric(fast.product) ? null : fast.product.id,
      toBuy: isGeneric(fast.product),
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
