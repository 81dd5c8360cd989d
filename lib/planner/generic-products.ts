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
