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
  const { amountOf, productOf, amountAndProduct } = useDoseWords();
  const { amount } = useUnits();
  const measured = (dose: PlanDose): string => {
    const { unit, measure } = dose;
    const filled = markedMeasures(dose);
    if (measure === null || filled?.how !== 'whole') return amountAndProduct(dose);
    const figures = {
      count: filled.count,
      each: amount(measure, unit),
      total: amountOf(dose),
      product: productOf(dose),
    };
    return t(unit === 'g' ? 'scoops' : 'measures', figures);
  };
  return (dose) => t('line', { measured: measured(dose), name: dose.productName ?? 'none' });
}
