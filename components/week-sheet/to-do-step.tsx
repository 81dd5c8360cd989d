'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { TickStep } from '@/components/situations/tick-step';
import type { SituationStep } from '@/lib/schemas/situation';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useStepWords } from './use-step-words';
import { useTimes } from './use-times';

/** A step of the open situation on its day: a box to tick, or a test to make. */
export function ToDoStep({ step }: { step: SituationStep }) {
  const t = useTranslations('week.situation');
  const { sheet } = useSheet();
  const words = useStepWords()(step);
  const times = useTimes();
  const { situation } = sheet;
  if (!situation || words === undefined) return null;
  if (step.kind === 'test')
    return (
      <PageLink
        href="/test"
        className="inline-flex min-h-6 items-center font-emphasis underline decoration-1 underline-offset-3 pointer-coarse:min-h-11"
      >
        {words}
      </PageLink>
    );
  return (
    <TickStep
      situationId={situation.id}
      step={step}
      name={words}
      note={undefined}
      who={step.doneAt === null ? undefined : times.clock(instantOf(step.doneAt))}
      offReason={sheet.me.role === 'viewer' ? t('viewer') : undefined}
    />
  );
}
