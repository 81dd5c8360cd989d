import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { DoseReason } from '../codes';
import { isGeneric } from '../generic-products';
import type { CompanionProduct } from './companion-product';

/** A dose beside chlorine as a plan names it; what the shelf does not hold enough of is to buy. */
export function plannedCompanion(
  product: CompanionProduct,
  {
    at,
    amount,
    effect,
    reason,
    timeZone,
  }: Pick<PlannedDose, 'amount'> & {
    at: number;
    effect: NonNullable<PlannedDose['effect']>;
    reason: DoseReason;
    timeZone: string;
  },
): PlannedDose {
  const { id, substance, form, stock } = product;
  return {
    at: toOffsetIso(at, timeZone),
    product: isGeneric(product) ? null : id,
    toBuy: isGeneric(product) || stock < amount,
    substance,
    form,
    amount,
    unit: form === 'liquid' ? 'mL' : 'g',
    rise: 0,
    effect,
    reason,
  };
}
