import { formatForInput, formatQuantityIn } from '@/lib/units/format';
import { parseQuantity } from '@/lib/units/parse';
import type { UnitSystem } from '@/lib/units/unit';
import { type EntryQuantity, typedUnit } from './quantities';

/** What was typed as the value inside (mg/L, pH, degrees C); undefined when it is no number. */
export function typedValue(text: string, quantity: EntryQuantity, system: UnitSystem): number | undefined {
  if (quantity === 'temperature') return parseQuantity(text, 'temperature', system === 'metric' ? 'degC' : 'degF');
  if (quantity === 'pH') return parseQuantity(text, 'pH', 'pH');
  return parseQuantity(text, 'freeChlorine', 'mg/L');
}

/** A value inside as it is typed in a field. */
export function textOf(value: number, quantity: EntryQuantity, system: UnitSystem, locale: string): string {
  if (quantity === 'temperature')
    return formatForInput(Math.round(value * 10) / 10, 'temperature', system === 'metric' ? 'degC' : 'degF', locale);
  if (quantity === 'pH') return formatForInput(value, 'pH', 'pH', locale);
  return formatForInput(value, 'freeChlorine', 'mg/L', locale);
}

/** A value with as many decimals as that quantity is told with. */
export function writtenValue(value: number, quantity: EntryQuantity, system: UnitSystem, locale: string): string {
  const unit = typedUnit(quantity, system);
  if (unit === 'degC' || unit === 'degF') return formatQuantityIn(value, 'temperature', unit, locale).value;
  if (unit === 'pH') return formatQuantityIn(value, 'pH', unit, locale).value;
  const chlorine = quantity === 'freeChlorine' || quantity === 'totalChlorine';
  return formatQuantityIn(value, chlorine ? 'freeChlorine' : 'totalAlkalinity', unit, locale).value;
}
