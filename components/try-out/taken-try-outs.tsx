'use client';

import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { usePutBackTryOut } from '@/lib/client/try-out';
import type { TakenTryOut } from '@/lib/schemas/try-out';
import { useChangeWords } from './use-change-words';
import { useTryProblemWords } from './use-try-problem-words';

/** What was tried and is in the plan now, each with the way back. */
export function TakenTryOuts() {
  const t = useTranslations('try-out');
  const { tryOuts } = useSheet().sheet;
  if (tryOuts.length === 0) return null;
  return (
    <ul aria-label={t('takenTitle')} className="mb-3 grid gap-2 border-y border-rule py-2">
      {tryOuts.map((tryOut) => (
        <li key={tryOut.id}>
          <Taken tryOut={tryOut} />
        </li>
      ))}
    </ul>
  );
}

function Taken({ tryOut }: { tryOut: TakenTryOut }) {
  const t = useTranslations('try-out');
  const { sheet } = useSheet();
  const problemWords = useTryProblemWords();
  const putBack = usePutBackTryOut();
  const changes = useChangeWords()(tryOut.changes);
  return (
    <>
      <p className="text-body">{t('taken', { name: tryOut.takenBy, changes })}</p>
      {sheet.me.role !== 'viewer' && (
        <Button
          variant="quiet"
          className="-ml-1.5"
          aria-label={t('putBackOf', { changes })}
          onClick={() => putBack.mutate(tryOut.id)}
          busy={putBack.isPending ? t('puttingBack') : undefined}
        >
          {t('putBack')}
        </Button>
      )}
      {putBack.isError && <ProblemState title={t('notPutBack')}>{problemWords(putBack.error)}</ProblemState>}
    </>
  );
}
