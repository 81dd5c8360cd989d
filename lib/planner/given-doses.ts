import { parseInstant } from '@/lib/calendar/wall-time';
import { AppError } from '@/lib/errors';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import type { DoseUnit } from '@/lib/schemas/dose';
import type { Pool } from '@/lib/schemas/pool';
import type { ShelfProduct, substances } from '@/lib/schemas/shelf-product';
import { generic } from './generic-products';
import { isTabletSubstance, liquidStrength, tabletOf } from './product-facts';

/** A dose as somebody names it: of a product on the shelf, or of a substance that has to be bought. */
export type NamedDose = {
  at: string;
  product?: string | null | undefined;
  substance?: (typeof substances)[number] | undefined;
  amount: number;
  unit: DoseUnit;
};

/**
 * A named dose as the projection takes it: liquid at its strength on that day, what has to be bought at usual strength.
 *
 * Errors: invalid-input with the dose's path for a product that is not on the shelf, cannot be reckoned with, or is
 * counted in another unit.
 */
export function weekDoseOf(named: NamedDose, path: string, shelf: readonly ShelfProduct[], pool: Pool): WeekDose {
  const problem = (field: string, message: string) =>
    new AppError('invalid-input', message, { problems: [{ path: `${path}.${field}`, message }] });
  const product = productOf(named, shelf);
  if (!product)
    throw problem(
      'product',
      (named.product ?? null) === null
        ? 'Name a product of the shelf, or a substance.'
        : `No product "${named.product}" is on the shelf.`,
    );
  if (product.substance === 'other')
    throw problem('product', 'A blend cannot be reckoned with: its contents are not known.');
  const at = parseInstant(named.at)!;
  const unit = product.form === 'tablet' ? 'tablet' : product.form === 'liquid' ? 'mL' : 'g';
  if (named.unit !== unit) throw problem('unit', `This product is counted in ${unit}.`);
  const { substance, alkali } = product;
  if (product.form === 'tablet') {
    if (!isTabletSubstance(substance))
      throw problem('product', 'These tablets bring no chlorine: they cannot be reckoned with.');
    return { at, kind: 'tablets', load: { ...tabletOf(substance, product), count: named.amount, erodedShare: 0 } };
  }
  const hypochlorite = substance === 'sodium-hypochlorite' || substance === 'calcium-hypochlorite';
  // Where the label was not copied: as shops sell it, here as in what is planned.
  const strength =
    substance === 'sodium-hypochlorite'
      ? liquidStrength(product, pool.timeZone)(at).strength
      : (product.strength ?? generic[substance].strength);
  return weekDose(
    at,
    {
      substance,
      amount: named.amount,
      ...(strength === undefined ? {} : { strength }),
      ...(hypochlorite ? { alkali } : {}),
    },
    pool.volume,
  );
}

function productOf({ product, substance }: NamedDose, shelf: readonly ShelfProduct[]): ShelfProduct | undefined {
  if ((product ?? null) !== null) return shelf.find(({ id }) => id === product);
  return substance && generic[substance];
}
