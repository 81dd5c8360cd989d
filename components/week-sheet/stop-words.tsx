'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { emergencyCard } from '@/components/navigation/addresses';
import { StopWord } from '@/components/ui/callout';
import type { PlanDose } from '@/lib/schemas/plan-dose';

/** What must never happen; beside a dose of acid or tablets also what holds for those, and always the emergency card. */
export function StopWords({ dose, headed = false }: { dose?: PlanDose | undefined; headed?: boolean }) {
  const common = useTranslations('common');
  const navigation = useTranslations('navigation');
  const t = useTranslations('doses.stop');
  const own = dose && stopOf(dose);
  return (
    <>
      {headed ? common('neverMix') : common.rich('neverMixStop', { stop: (words) => <StopWord>{words}</StopWord> })}{' '}
      {own && <>{t(own)} </>}
      <PageLink href={emergencyCard} className="whitespace-nowrap underline decoration-1 underline-offset-3">
        {navigation('emergencyCard')}
      </PageLink>
    </>
  );
}

/** The Stop of its own that a product has. */
export function stopOf({ form, steps }: PlanDose): 'acid' | 'tablets' | undefined {
  if (form === 'tablet') return 'tablets';
  return steps === 'acid' ? 'acid' : undefined;
}
