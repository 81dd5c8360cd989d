'use client';

import { useTranslations } from 'next-intl';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { DoseReason as Code } from '@/lib/planner/codes';

/** Which product it is, and why it goes in. */
export function DoseReason({ dose }: { dose: PlanDose }) {
  const t = useTranslations('doses');
  const known = (code: string): code is Code => t.has(`reason.${code as Code}`);
  return (
    <p className="text-small text-ink-2">
      {dose.toBuy && <>{t('toBuy')} </>}
      {!dose.toBuy && dose.productName !== null && <>{t('from', { name: dose.productName })} </>}
      {known(dose.reason) && t(`reason.${dose.reason}`)}
    </p>
  );
}
