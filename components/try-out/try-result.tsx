'use client';

import { useTranslations } from 'next-intl';
import { useLayoutEffect, useState } from 'react';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { whenPainted } from '@/components/ui/when-painted';
import { useSheet } from '@/components/week-sheet/sheet-context';
import type { Tried } from '@/lib/client/try-it/use-try-it';
import { useTakeTryOut } from '@/lib/client/try-out';
import type { TryOutChanges } from '@/lib/schemas/try-out';
import { useTrySentences } from './use-try-sentences';
import { useTryProblemWords } from './use-try-problem-words';

type Props = {
  planId: string;
  changes: TryOutChanges;
  tried: Tried;
  /** The try-out is in the plan now. */
  onUsed: () => void;
  onPutBack: () => void;
};

/** What becomes of the week, and what may be done about it. */
export function TryResult({ planId, changes, tried, onUsed, onPutBack }: Props) {
  const t = useTranslations('try-out');
  const sentences = useTrySentences();
  const { course, advice, failed } = tried;
  useMarkSentence(course?.number);
  return (
    <>
      <div className="grid grid-cols-[32px_minmax(0,1fr)] gap-x-2">
        <svg width="32" height="20" viewBox="0 0 32 20" aria-hidden="true">
          <path d="M0 10H32" fill="none" className="stroke-ink" strokeWidth="1.6" strokeDasharray="5 4" />
        </svg>
        <p aria-live="polite" className="min-h-10 text-body">
          {failed ? t('failed') : course ? sentences(changes, course.facts, advice).join(' ') : t('working')}
        </p>
      </div>
      <div className="flex flex-wrap items-start gap-x-4 gap-y-1 pl-10">
        <Use planId={planId} changes={changes} tried={tried} onUsed={onUsed} />
        <Button variant="quiet" onClick={onPutBack}>
          {t('putBack')}
        </Button>
      </div>
    </>
  );
}

function Use({ planId, changes, tried: { advice, failed }, onUsed }: Omit<Props, 'onPutBack'>) {
  const t = useTranslations('try-out');
  const { sheet } = useSheet();
  const problemWords = useTryProblemWords();
  const take = useTakeTryOut(onUsed);
  // The same changes keep their id, so that sending them again takes them once.
  const [sent, setSent] = useState<{ id: string; what: string } | undefined>(undefined);
  if (sheet.me.role === 'viewer') return <p className="w-full text-small text-ink-2">{t('viewer')}</p>;
  if (failed || advice?.code === 'refused') return null;
  const use = () => {
    const what = JSON.stringify([planId, changes]);
    const id = sent?.what === what ? sent.id : crypto.randomUUID();
    setSent({ id, what });
    // Where it fails that is said below, and what was tried stays on the screen.
    take.mutate({ id, planId, ...changes });
  };
  return (
    <>
      <Button
        onClick={use}
        busy={take.isPending ? t('using') : undefined}
        offReasonId={advice === undefined ? 'try-it-wait' : undefined}
      >
        {t('use')}
      </Button>
      {/* Beside the button, which keeps its focus when the reason goes. */}
      {advice === undefined && (
        <p id="try-it-wait" className="order-last w-full text-small text-ink-2">
          {t('wait')}
        </p>
      )}
      {take.isError && (
        <ProblemState className="w-full" title={t('notUsed')}>
          {problemWords(take.error)}
        </ProblemState>
      )}
    </>
  );
}

/** Marks when an answer's words are on the screen. */
function useMarkSentence(answer: number | undefined): void {
  useLayoutEffect(
    () => (answer === undefined ? undefined : whenPainted(() => performance.mark('try-it:sentence'))),
    [answer],
  );
}
