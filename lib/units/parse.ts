import { assertUnitOf, type Quantity, type UnitOfQuantity } from './quantity';
import { toInside } from './unit';

/**
 * The number a person typed. One decimal sign, comma or point, whatever the page's language; no grouping, since nobody can
 * tell whether "1,234" was meant as a thousand: it is 1.234, and what follows shows it with its unit. ".5" is 0.5; "5." is
 * unfinished. The typographic minus is one. Spaces around it do not count.
 *
 * Returns undefined for anything else, "1,234.5" and "1 234" included: never a guess.
 */
export function parseDecimal(text: string): number | undefined {
  const typed = text.trim().replace('\u2212', '-');
  if (!/^-?(?:\d+(?:[.,]\d+)?|[.,]\d+)$/.test(typed)) return undefined;
  const value = Number(typed.replace(',', '.'));
  // Adding 0 turns -0 into 0.
  return Number.isFinite(value) ? value + 0 : undefined;
}

/**
 * What a person typed in a unit, as the value used inside (m3, m, g, mL, degrees C, mg/L, kPa, money per kg or L);
 * undefined when it is no number.
 */
export function parseQuantity<Q extends Quantity>(
  text: string,
  quantity: Q,
  unit: UnitOfQuantity<Q>,
): number | undefined {
  assertUnitOf(quantity, unit);
  const value = parseDecimal(text);
  return value === undefined ? undefined : toInside(value, unit);
}

/** "18,000", "18.000", "18 000": digits in groups of three. */
const grouped = /^\d{1,3}(?:([.,\u0020\u00a0\u202f'\u2019])\d{3})(?:\1\d{3})*$/;

/**
 * The volume of a pool as people write it. Here a comma or point before three digits groups thousands, since nobody knows
 * a pool to a thousandth: "18,000" is eighteen thousand, "18,5" and "18.50" are a fraction. Whoever did mean 18 m3 is asked
 * back, because no garden pool holds 18,000.
 */
export function parseVolume(text: string): number | undefined {
  const typed = text.trim();
  return parseDecimal(grouped.test(typed) ? typed.replace(/\D/g, '') : typed);
}
