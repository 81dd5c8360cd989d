import 'server-only';
import type { ShelfProductRow, ShelfProductValues } from '@/db/queries/shelf-products';
import type { HouseholdProduct } from '@/lib/schemas/household-product';

/** The stored row as the household knows the product; what was not said is left out. */
export function productOf(row: ShelfProductRow): HouseholdProduct {
  const { id, form, substance, alkali, labelWay, stock, storedAt } = row;
  return {
    ...{ id, form, substance, alkali, labelWay, stock, storedAt },
    ...(row.name === null ? {} : { name: row.name }),
    ...(row.strength === null ? {} : { strength: row.strength }),
    ...(row.tabletMass === null ? {} : { tabletMass: row.tabletMass }),
    ...(row.measure === null ? {} : { measure: row.measure }),
    ...(row.pricePerKg === null ? {} : { pricePerKg: row.pricePerKg }),
    ...(row.pricePerLitre === null ? {} : { pricePerLitre: row.pricePerLitre }),
    ...(row.boughtOn === null ? {} : { boughtOn: row.boughtOn }),
  };
}

/** All columns, so that saving a product again also takes away what was said before and is not said now. */
export function productValues(product: HouseholdProduct): ShelfProductValues {
  const { name, strength, tabletMass, measure, pricePerKg, pricePerLitre, boughtOn, ...always } = product;
  return {
    ...always,
    name: name ?? null,
    strength: strength ?? null,
    tabletMass: tabletMass ?? null,
    measure: measure ?? null,
    pricePerKg: pricePerKg ?? null,
    pricePerLitre: pricePerLitre ?? null,
    boughtOn: boughtOn ?? null,
  };
}
