import { useTranslations } from 'next-intl';
import type { RecordedReading } from '@/lib/schemas/reading';
import type { MeasuredQuantity } from '@/lib/schemas/measured-range';
import { middleOf, type Value } from './entered';
import type { EntryQuantity } from './quantities';
import { useValueWords } from './use-value-words';

const order = [
  'freeChlorine',
  'combinedChlorine',
  'pH',
  'totalAlkalinity',
  'cyanuricAcid',
  'calciumHardness',
  'temperature',
] as const satisfies readonly MeasuredQuantity[];

/** A whole reading in a sentence, and what was not measured. */
export function useReadingWords() {
  const t = useTranslations('readings');
  const words = useValueWords();
  return ({ method, values }: Pick<RecordedReading, 'method' | 'values'>): { measured: string; missing: string } => {
    const said = (value: Value, quantity: EntryQuantity) =>
      method === 'strip' || typeof value !== 'number' ? words.printed(value, quantity) : words.value(value, quantity);
    const measured = order.flatMap((quantity) => {
      const value = values[quantity];
      if (value === undefined) return [];
      if (quantity !== 'combinedChlorine')
        return [t('saved.one', { name: t(`quantity.${quantity}`), value: said(value, quantity) })];
      return [
        middleOf(value) === 0
          ? t('saved.combinedNone')
          : t('saved.one', { name: t('saved.combined'), value: said(value, 'totalChlorine') }),
      ];
    });
    const missing = order
      .filter((quantity) => quantity !== 'combinedChlorine' && values[quantity] === undefined)
      .map((quantity) => t(`quantity.${quantity as Exclude<typeof quantity, 'combinedChlorine'>}`));
    return { measured: measured.join('; '), missing: missing.join(', ') };
  };
}
