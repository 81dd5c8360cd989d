import { AppError } from '@/lib/errors';
import type { WeekDose } from '@/lib/projection/events';
import type { Scenario } from '@/lib/schemas/scenario';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import type { Wishes } from '@/lib/schemas/wishes';
import { weekDoseOf } from './given-doses';
import { tabletFacts } from './product-facts';
import { wishedProduct } from './wishes';

/**
 * Wished doses as the projection takes them.
 *
 * Errors: invalid-input for a dose that is no chlorine, cannot be reckoned with, or is counted in another unit.
 */
export function wishedWeekDoses(wishes: Wishes, scenario: Scenario): WeekDose[] {
  return wishes.doses.map((wish, index) => {
    const path = `wishes.doses[${index}]`;
    const product = wishedProduct(wish, scenario);
    const dose = weekDoseOf(wish, path, product ? [product] : [], scenario.pool);
    if (dose.kind === 'dose' && dose.contents.freeChlorine === 0) {
      const message = 'Only chlorine can be wished for another evening.';
      throw new AppError('invalid-input', message, { problems: [{ path: `${path}.product`, message }] });
    }
    return dose;
  });
}

/** How much of a product wishes take [g or mL]; tablets by their mass. */
export function wishedOf(product: ShelfProduct, { doses }: Wishes): number {
  const { tabletMass } = tabletFacts(product);
  return doses
    .filter(({ product: id }) => id === product.id)
    .reduce((sum, { amount, unit }) => sum + amount * (unit === 'tablet' ? tabletMass : 1), 0);
}
