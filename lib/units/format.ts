import { AppError } from '@/lib/errors';
import { assertUnitOf, ladderOf, type Quantity, type UnitOfQuantity, type Writing } from './quantity';
import { fromInside, type UnitCode, type UnitSystem } from './unit';

/** A value ready to be read; the unit's word stands in the messages under its code. */
export type Written = { value: string; unitCode: UnitCode };

/**
 * A number with a fixed count of decimals and the locale's decimal sign. Never grouped, so that it can be typed as it
 * stands; never "-0"; digits 0 to 9 in every locale.
 *
 * Error: `invalid-input` for a number that is not finite.
 */
export function formatNumber(value: number, { decimals, locale }: { decimals: number; locale: string }): string {
  return written(value, locale, decimals, decimals);
}

/**
 * A value from inside (m3, m, g, mL, degrees C, mg/L, kPa, money per kg or L) as a household of one system of units reads
 * it: grams below a kilogram, ounces below a pound, and so on. The unit is chosen after rounding: 999.7 g is "1 kg".
 */
export function formatQuantity(value: number, quantity: Quantity, system: UnitSystem, locale: string): Written {
  const ladder = ladderOf(quantity, system);
  const fits = ({ unit, decimals, below = Infinity }: Writing & { below?: number }) =>
    Math.abs(Number(fromInside(value, unit).toFixed(decimals))) < below;
  const writing = ladder.find(fits);
  if (!writing) throw new AppError('invalid-input', `${value} is not a ${quantity}.`);
  return writtenAs(value, writing, locale);
}

/** The same in one given unit of the quantity: for the ends of a range, the ticks of an axis, a column of a table. */
export function formatQuantityIn<Q extends Quantity>(
  value: number,
  quantity: Q,
  unit: UnitOfQuantity<Q>,
  locale: string,
): Written {
  assertUnitOf(quantity, unit);
  const writings = (['metric', 'us'] as const).flatMap((system) => [...ladderOf(quantity, system)]);
  return writtenAs(value, writings.find((writing) => writing.unit === unit) ?? { unit, decimals: 2 }, locale);
}

/**
 * A value as it goes back into the field it was typed into: as many decimals as it has, up to ten significant figures, so
 * that 18000 gallons kept as 68.137412112 m3 come back as "18000". `parseQuantity` reads it back within 1e-9.
 */
export function formatForInput<Q extends Quantity>(
  value: number,
  quantity: Q,
  unit: UnitOfQuantity<Q>,
  locale: string,
): string {
  assertUnitOf(quantity, unit);
  return written(Number(fromInside(value, unit).toPrecision(10)), locale, 0, 20);
}

function writtenAs(value: number, { unit, decimals, keep }: Writing, locale: string): Written {
  return { value: written(fromInside(value, unit), locale, keep ? decimals : 0, decimals), unitCode: unit };
}

const formatters = new Map<string, Intl.NumberFormat>();

function written(value: number, locale: string, fewest: number, most: number): string {
  if (!Number.isFinite(value)) throw new AppError('invalid-input', `${value} cannot be written as a number.`);
  const key = `${locale} ${fewest} ${most}`;
  const formatter =
    formatters.get(key) ??
    new Intl.NumberFormat(locale, {
      minimumFractionDigits: fewest,
      maximumFractionDigits: most,
      useGrouping: false,
      numberingSystem: 'latn',
      // No sign for what rounds to zero.
      signDisplay: 'negative',
    });
  formatters.set(key, formatter);
  return formatter.format(value);
}
