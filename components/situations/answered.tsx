'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { useAnswerSituation } from '@/lib/client/situations';
import type { OpenSituation } from '@/lib/schemas/situation';
import { QuestionForm } from './question-form';
import { draftOf, questionsOf } from './questions';
import { useHousehold } from './situation-context';
import { useCodeWords } from './use-code-words';

/** Which way the answers and the water lead, and why; the questions once more on demand. */
export function Answered({ open: { id, situation, procedure } }: { open: OpenSituation }) {
  const t = useTranslations('situations');
  const { mayOpen } = useHousehold();
  const words = useCodeWords();
  const answer = useAnswerSituation();
  const [again, setAgain] = useState(false);
  const branch = words.branch(procedure.branch);
  const reasons = procedure.reasons.map(words.reason).filter((reason) => reason !== undefined);
  const hasQuestions = questionsOf(situation.kind).length > 0;
  return (
    <div>
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 border-t border-rule-2 pt-2.5">
        <p className="max-w-[46rem] min-w-0 flex-1 text-pretty">
          {branch !== undefined && <b className="font-strong">{t('so', { branch })} </b>}
          {reasons.join(' ')}
        </p>
        {hasQuestions && mayOpen && !again && (
          <Button variant="quiet" size="small" onClick={() => setAgain(true)}>
            {t('questions.again')}
          </Button>
        )}
      </div>
      {again && (
        <QuestionForm
          kind={situation.kind}
          answered={draftOf(situation)}
          error={answer.error}
          onSend={(changed) => answer.mutate({ id, situation: changed }, { onSuccess: () => setAgain(false) })}
        >
          <div className="flex flex-wrap gap-2.5">
            <Button type="submit" variant="primary" busy={answer.isPending ? t('questions.savingAgain') : undefined}>
              {t('questions.saveAgain')}
            </Button>
            <Button variant="quiet" onClick={() => setAgain(false)}>
              {t('questions.leaveAgain')}
            </Button>
          </div>
        </QuestionForm>
      )}
    </div>
  );
}
