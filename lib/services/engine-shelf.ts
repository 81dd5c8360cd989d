import 'server-only';
import type { StoredDose } from '@/db/queries/plan-doses';
import type { ShelfProductRow } from '@/db/queries/shelf-products';
import { type ShelfProduct, shelfProductSchema } from '@/lib/schemas/shelf-product';
import { given } from './engine-pool';

/** A product as the engine takes it: without what the family calls it. */
export function engineProduct(row: ShelfProductRow): ShelfProduct {
  const { householdId: _household, name: _name, createdAt: _created, ...values } = row;
  return shelfProductSchema.parse(given(values));
}

type GivenDose = Pick<StoredDose, 'productId' | 'substance' | 'form'>;

/** The id under which a given dose's product stands in a scenario: its own, or that of what a shop sells. */
export function productIdOf({ productId, substance, form }: GivenDose): string {
  return productId ?? `bought-${form}-${substance}`;
}

/**
 * Products that are no longer on the shelf, or never stood there because they were bought for the dose, but of which
 * something went into the water: nothing left of them, known by what the shelf said at the time, else by what shops sell.
 */
export function goneProducts(
  doses: readonly GivenDose[],
  shelf: readonly ShelfProduct[],
  formerly: readonly ShelfProduct[],
): ShelfProduct[] {
  const gone = new Map<string, ShelfProduct>();
  for (const dose of doses) {
    const id = productIdOf(dose);
    if (gone.has(id) || shelf.some((product) => product.id === id)) continue;
    const known = formerly.find((product) => product.id === id) ?? boughtProduct(id, dose);
    gone.set(id, { ...known, stock: 0 });
  }
  return [...gone.values()];
}

/** Strength that shops sell most [% available chlorine, trade %, % by weight]. */
const usualStrength: Partial<Record<GivenDose['substance'], number>> = {
  trichlor: 90,
  dichlor: 55.4,
  'calcium-hypochlorite': 65,
  'sodium-hypochlorite': 12.5,
  'hydrochloric-acid': 31.45,
  'sodium-bisulfate': 93,
  'calcium-chloride': 77,
};

function boughtProduct(id: string, { substance, form }: GivenDose): ShelfProduct {
  return shelfProductSchema.parse({ id, form, substance, strength: usualStrength[substance] });
}
