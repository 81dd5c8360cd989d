import type { Scenario } from '@/lib/schemas/scenario';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import { generic } from '../generic-products';
import { avoided } from '../products';
import type { CompanionSubstance } from './need';

export type CompanionProduct = ShelfProduct & { substance: CompanionSubstance };

/** What the shelf holds of any of the substances, else the usual one to buy. */
export function productFor(
  substances: readonly CompanionSubstance[],
  { shelf, preferences }: Scenario,
): CompanionProduct | undefined {
  const is = (product: ShelfProduct): product is CompanionProduct =>
    substances.some((each) => each === product.substance);
  const held = shelf.filter((product) => is(product) && product.stock > 0);
  const offered = [...held, ...substances.map((substance) => generic[substance])];
  return offered.filter(is).find((product) => !avoided(product, preferences.avoid));
}

/** Whether something of it has gone into this water before. */
export function everGiven(substance: CompanionSubstance, { given, shelf }: Scenario): boolean {
  return given.some(({ product: id }) => shelf.find((product) => product.id === id)?.substance === substance);
}
