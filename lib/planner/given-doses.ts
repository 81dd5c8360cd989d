import { parseInstant } from '@/lib/calendar/wall-time';
import type { Substance } from '@/lib/chemistry';
import { AppError } from '@/lib/errors';
import { type WeekDose, weekDose } from '@/lib/projection/events';
import type { GivenDose } from '@/lib/schemas/dose';
import type { Pool } from '@/lib/schemas/pool';
import type { ShelfProduct } from '@/lib/schemas/shelf-product';
import { liquidStrength } from './products';

/**
 * A dose of a shelf product as the projection takes it: liquid at its strength on that day.
 *
 * Errors: invalid-input with the dose's path for a product that is not on the shelf, cannot be reckoned with, or is
 * counted in another unit.
 */
export function weekDoseOf(given: GivenDose, path: string, shelf: readonly ShelfProduct[], pool: Pool): WeekDose {
  const problem = (field: string, message: string) =>
    new AppError('invalid-input', message, { problems: [{ path: `${path}.${field}`, message }] });
  const product = shelf.find(({ id }) => id === given.product);
  if (!product) throw problem('product', `No product "${given.product}" is on the shelf.`);
  if (product.substance === 'other')
    throw problem('product', 'A blend cannot be reckoned with: its contents are not known.');
  const at = parseInstant(given.at)!;
  const unit = product.form === 'tablet' ? 'tablet' : product.form === 'liquid' ? 'mL' : 'g';
  if (given.unit !== unit) throw problem('unit', `This product is counted in ${unit}.`);
  if (product.form === 'tablet') {
    const tabletMass = product.tabletMass ?? 227;
    return {
      at,
      kind: 'tablets',
      load: { tabletMass, count: given.amount, strength: product.strength ?? 90, erodedShare: 0 },
    };
  }
  const substance: Substance = product.substance;
  const strength =
    substance === 'sodium-hypochlorite' ? liquidStrength(product, pool.timeZone)(at).strength : product.strength;
  const dose = { substance, amount: given.amount, ...(strength === undefined ? {} : { strength }) };
  const alkali =
    substance === 'sodium-hypochlorite' || substance === 'calcium-hypochlorite' ? { alkali: product.alkali } : {};
  return weekDose(at, { ...dose, ...alkali }, pool.volume);
}
