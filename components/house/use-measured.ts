'use client';

import { useTranslations } from 'next-intl';
import { markedMeasures } from '@/components/week-sheet/marked-measures';
import { useDoseWords } from '@/components/week-sheet/use-dose-words';
import { useUnits } from '@/components/week-sheet/use-units';
import type { PlanDose } from '@/lib/schemas/plan-dose';

/**
 * A dose as somebody measures it out who does not do it every week: tablets counted, whole scoops of the marked measure
 * where one is kept, else its weight. Nobody has to guess at part of a scoop.
 */
export function useMeasured(): (dose: PlanDose) => string {
  const t = useTranslations('house.sheet.doses');
  const { amountOf, productOf } = useDoseWords();
  const { amount } = useUnits();
  const amountInWords = (dose: PlanDose): string => {
    const { unit, measure } = dose;
    if (unit === 'tablet') return t('tablets', { count: dose.amount });
    const filled = markedMeasures(dose);
    if (measure === null || filled?.how !== 'whole') return amountOf(dose);
    const figures = { count: filled.count, each: amount(measure, unit), total: amountOf(dose) };
    return t(unit === 'g' ? 'scoops' : 'measures', figures);
  };
  return (dose) =>
    t('line', { amount: amountInWords(dose), product: productOf(dose), name: dose.productName ?? 'none' });
}
