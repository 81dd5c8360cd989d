'use client';

import { useTranslations } from 'next-intl';
import { useDosingBar } from '@/components/week-sheet/use-dosing-bar';
import type { HouseSheet } from '@/lib/schemas/house-sheet';

/** Why the sheet holds no dose, in words, the gravest first; null where it holds some. */
export function useNothingToAdd({ handler, week, doses }: HouseSheet): string | null {
  const t = useTranslations('house.sheet.doses');
  const bar = useDosingBar();
  if (handler === null) return t('nobody');
  if (bar !== undefined) return t('barred', { reason: bar });
  if (week.doses.some(({ doubtful }) => doubtful)) return t('doubtful');
  // Its mornings decide, and a test each day; that cannot be handed over on paper.
  if (week.situation !== null) return t('situation');
  if (week.plan === null || week.plan.stale) return t('noPlan');
  return doses.length === 0 ? t('none') : null;
}
