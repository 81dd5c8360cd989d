'use client';

import { useLocale, useTranslations } from 'next-intl';
import type { ExampleUnit } from '@/lib/client/worked-out/examples/names';
import { formatNumber } from '@/lib/units/format';

const months = ['1', '2', '3', '4', '5', '6', '7', '8', '9', '10', '11', '12'] as const;

/** Words for a value of an example: with its unit, or a month by its name. */
export function useWritten() {
  const t = useTranslations('how-examples');
  const locale = useLocale();
  return (value: number, { unit, decimals }: { unit: ExampleUnit; decimals: number }): string => {
    if (unit === 'month') return t(`month.${months[Math.round(value) - 1] ?? '1'}`);
    const hour = unit === 'hourOfDay' ? value % 24 : value;
    return t(`unit.${unit}`, { value: formatNumber(hour, { decimals, locale }) });
  };
}
