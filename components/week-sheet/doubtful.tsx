'use client';

import { OctagonAlert } from 'lucide-react';
import { useTranslations } from 'next-intl';
import type { PlanDose } from '@/lib/schemas/plan-dose';

/** Two people ticked one dose: perhaps it went in twice, until a test says otherwise. */
export function Doubtful({ dose, small = false }: { dose: PlanDose; small?: boolean }) {
  const t = useTranslations('doses');
  if (!dose.doubtful) return null;
  return (
    <p className={`flex gap-2 font-emphasis text-terra-ink ${small ? 'text-fine' : 'text-small'}`}>
      <OctagonAlert aria-hidden="true" className="size-4.5 shrink-0" />
      {t('doubtful')}
    </p>
  );
}
