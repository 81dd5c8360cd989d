'use client';

import { useTranslations } from 'next-intl';
import type { CheckReason } from '@/lib/planner/codes';
import type { Check } from './checks';

/** Why a check is asked for; undefined for a reason that has no words. */
export function useCheckReason({ reason }: Check): string | undefined {
  const t = useTranslations('week.check');
  const known = (code: string): code is CheckReason => t.has(`reason.${code as CheckReason}`);
  return known(reason) ? t(`reason.${reason}`) : undefined;
}
