'use client';

import { useTranslations } from 'next-intl';
import { useRef } from 'react';
import { Button } from '@/components/ui/button';
import { Callout } from '@/components/ui/callout';
import { RequestProblem } from '@/lib/client/fetch-json';
import { useConfirmStop } from '@/lib/client/stop-confirmations';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { limits } from '@/lib/standards/limits';
import { useSheet } from './sheet-context';
import { StopWords } from './stop-words';
import { useTickProblem } from './use-tick-problem';

/** The Stop of a product, to be confirmed by name before its doses can be ticked. */
export function ConfirmStop({ dose }: { dose: PlanDose }) {
  const t = useTranslations('doses.stop');
  const common = useTranslations('common');
  const { name } = useSheet().sheet.me;
  const problemWords = useTickProblem();
  const { mutate, isPending, error } = useConfirmStop();
  const id = useRef<string | undefined>(undefined);

  const unheard = (problem: unknown) => problem instanceof RequestProblem && problem.code === 'no-connection';
  const confirm = () => {
    id.current ??= crypto.randomUUID();
    mutate(
      { id: id.current, doseId: dose.id },
      {
        onSettled: (_done, problem) => {
          // Without an answer it may have arrived: pressed again, it is the same confirmation.
          if (!unheard(problem)) id.current = undefined;
        },
      },
    );
  };

  return (
    <div role="group" aria-label={common('stop')}>
      <Callout
        severity="stop"
        word={common('stop')}
        actions={
          <Button wide className="py-2" onClick={confirm} busy={isPending ? t('confirming') : undefined}>
            {t('confirm', { name })}
          </Button>
        }
      >
        <p>
          <StopWords dose={dose} headed />
        </p>
        <p className="mt-1 text-small text-ink-2">{t('again', { days: limits.stopConfirmation.value })}</p>
      </Callout>
      {error !== null && (
        <p role="alert" className="mt-2 text-small font-emphasis text-terra-ink">
          {unheard(error) ? t('unsent') : problemWords(error)}
        </p>
      )}
    </div>
  );
}
