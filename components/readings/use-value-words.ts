import { useTranslations } from 'next-intl';
import { asInterval, type Value } from './entered';
import { type EntryQuantity, typedUnit } from './quantities';
import { useReadingSetting } from './reading-setting';
import { textOf, writtenValue } from './typed-value';

/** Values of a test in words, in the household's units. */
export function useValueWords() {
  const t = useTranslations('readings');
  const units = useTranslations('units');
  const { unitSystem, locale } = useReadingSetting();
  const figure = (value: number, quantity: EntryQuantity) => writtenValue(value, quantity, unitSystem, locale);
  const withUnit = (text: string, quantity: EntryQuantity) =>
    quantity === 'pH' ? text : units(typedUnit(quantity, unitSystem), { value: text });
  return {
    name: (quantity: EntryQuantity) => t(`quantity.${quantity}`),
    unit: (quantity: EntryQuantity) =>
      quantity === 'pH' ? '' : units(typedUnit(quantity, unitSystem), { value: '' }).trim(),
    figure,
    /** "3.0 mg/L". */
    value: (value: number, quantity: EntryQuantity) => withUnit(figure(value, quantity), quantity),
    /** As it is printed on a bottle: "3 mg/L", "between 1 and 3 mg/L". */
    printed: (value: Value, quantity: EntryQuantity) => {
      const { low, high } = asInterval(value);
      const step = (value: number) => textOf(value, quantity, unitSystem, locale);
      return withUnit(low === high ? step(low) : t('between', { low: step(low), high: step(high) }), quantity);
    },
  };
}
