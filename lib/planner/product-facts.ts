import { dayOf } from '@/lib/calendar/household-day';
import { contentsPerUnit } from '@/lib/chemistry';
import { SUBSTANCES } from '@/lib/chemistry/substances';
import type { TabletLoad } from '@/lib/projection/tablets';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import { strengthOnDay } from '@/lib/storage/liquid-strength';
import { generic } from './generic-products';

/** Mass [g] and available chlorine [%] of a tablet, the usual ones where the label was not copied. */
export function tabletFacts({ tabletMass, strength }: Pick<ShelfProduct, 'tabletMass' | 'strength'>) {
  return { tabletMass: tabletMass ?? 227, strength: strength ?? 90 };
}

type TabletSubstance = 'trichlor' | 'dichlor' | 'calcium-hypochlorite';

/** A tablet as the projection erodes it: of what is not trichlor, what 1 g brings. */
export function tabletOf(
  substance: TabletSubstance,
  label: Pick<ShelfProduct, 'tabletMass' | 'strength'>,
): Omit<TabletLoad, 'count' | 'erodedShare'> {
  if (substance === 'trichlor') return tabletFacts(label);
  const { tabletMass } = tabletFacts(label);
  const strength = label.strength ?? generic[substance].strength ?? SUBSTANCES[substance].defaultStrength;
  return { tabletMass, strength, contents: contentsPerUnit({ substance, strength }) };
}

export function isTabletSubstance(substance: string | undefined): substance is TabletSubstance {
  return substance === 'trichlor' || substance === 'dichlor' || substance === 'calcium-hypochlorite';
}

/** Strength of a bottle at an instant [ms]: trade %, and what share of the label's that is. */
export function liquidStrength(product: ShelfProduct, timeZone: string) {
  const labelled = product.strength ?? 12.5;
  return (at: number) => {
    const { boughtOn, storedAt } = product;
    if (boughtOn === undefined) return { strength: labelled, share: 1 };
    const strength = strengthOnDay({ strength: labelled, boughtOn, storedAt }, dayOf(at, timeZone));
    return { strength, share: strength / labelled };
  };
}

/** Price per kg or litre; the usual one where the shelf names none. */
export function priceOf({ form, substance, pricePerKg, pricePerLitre }: ShelfProduct): number {
  const usual = substance === 'other' ? undefined : generic[substance];
  return (form === 'liquid' ? (pricePerLitre ?? usual?.pricePerLitre) : (pricePerKg ?? usual?.pricePerKg)) ?? 0;
}
