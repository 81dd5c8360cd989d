import { type ShelfProduct, shelfProductSchema } from '@/lib/schemas/shelf-product';
import { assumedPrice } from './weights';

const generic = (product: object): ShelfProduct => shelfProductSchema.parse({ stock: 1e6, ...product });

/** What a shop sells, for a dose or a comparison that the shelf has no product for: such a dose is marked to buy. */
export const genericGranules = generic({
  id: 'generic-granules',
  form: 'granular',
  substance: 'calcium-hypochlorite',
  strength: 65,
  labelWay: 'dissolve',
  measure: 50,
  pricePerKg: assumedPrice.perKilogram,
});
export const genericLiquid = generic({
  id: 'generic-liquid',
  form: 'liquid',
  substance: 'sodium-hypochlorite',
  strength: 12.5,
  measure: 250,
  pricePerLitre: assumedPrice.perLitre,
});

export function isGeneric(product: ShelfProduct): boolean {
  return product === genericGranules || product === genericLiquid;
}
