'use client';

import { useTranslations } from 'next-intl';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { markedMeasures } from './marked-measures';
import { useUnits } from './use-units';

/** "250 g, that is 5 of your marked measure.": where the household keeps one for the product. */
export function MarkedMeasure({ dose, small = false }: { dose: PlanDose; small?: boolean }) {
  const t = useTranslations('doses.measure');
  const units = useUnits();
  const filled = markedMeasures(dose);
  if (filled === undefined) return null;
  const amount = units.amount(dose.amount, dose.unit);
  const words = () => {
    if (filled.how === 'whole') return t('whole', { amount, count: filled.count });
    if (filled.how === 'decimal') return t('about', { amount, count: units.number(filled.count) });
    const { whole, quarters } = filled;
    return t('about', { amount, count: t('quarters', { whole, quarters: String(quarters) }) });
  };
  return <p className={small ? 'text-fine' : 'font-emphasis'}>{words()}</p>;
}
