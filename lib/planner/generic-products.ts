import { type ShelfProduct, shelfProductSchema, type substances } from '@/lib/schemas/shelf-product';
import { genericProducts } from '@/lib/standards/generic-products';

/** What a shop sells of a substance, as a product that there is enough of: its doses are marked to buy. */
export const generic = Object.fromEntries(
  Object.entries(genericProducts).map(([substance, product]) => [
    substance,
    shelfProductSchema.parse({ substance, stock: 1e6, ...product }),
  ]),
) as Record<(typeof substances)[number], ShelfProduct>;

export function isGeneric(product: ShelfProduct): boolean {
  return product.substance !== 'other' && generic[product.substance] === product;
}

/** The product of what shops sell that has an id. */
export function genericOf(id: string): ShelfProduct | undefined {
  return Object.values(generic).find((product) => product.id === id);
}

/** The id of what shops sell of a substance. */
export function genericIdOf(substance: ShelfProduct['substance']): string {
  return substance === 'other' ? substance : generic[substance].id;
}
