'use client';

import { InlineStop } from '@/components/ui/callout';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { StopWords } from './stop-words';

/** What must never happen, beside every dose. */
export function StopLine({ dose, className = '' }: { dose?: PlanDose; className?: string }) {
  return (
    <InlineStop className={className}>
      <StopWords dose={dose} />
    </InlineStop>
  );
}
