'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { Situation, SituationKind } from '@/lib/schemas/situation';
import { QuestionField } from './question-field';
import { askedNow, type Draft, type Question, questionsOf, readAnswers } from './questions';

type Props = {
  kind: SituationKind;
  answered?: Draft;
  onSend: (situation: Situation) => void;
  /** What went wrong with the last sending. */
  error: Error | null;
  /** The buttons, under the questions. */
  children: React.ReactNode;
};

/** The questions that choose the steps, every one of them to be answered. */
export function QuestionForm({ kind, answered = {}, onSend, error, children }: Props) {
  const t = useTranslations('situations');
  const problemWords = useProblemWords();
  const [draft, setDraft] = useState<Draft>(answered);
  const [sent, setSent] = useState(false);
  const read = readAnswers(kind, draft);
  const problems = sent && 'problems' in read ? read.problems : {};
  const asked = askedNow(kind, draft);
  const problemOf = ({ name, as }: Question) => {
    if (!Object.hasOwn(problems, name)) return undefined;
    if (problems[name] !== undefined) return problems[name];
    return t(as === 'day' ? 'questions.missingDay' : as === 'text' ? 'questions.missingName' : 'questions.missing');
  };
  return (
    <form
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        setSent(true);
        if ('situation' in read) onSend(read.situation);
      }}
    >
      {questionsOf(kind).length > 0 && (
        <section
          aria-label={t('questions.label')}
          className="grid gap-4 border-t border-rule-2 py-3.5 md:grid-cols-[118px_minmax(0,1fr)]"
        >
          <div>
            <h2 className="font-display text-name">{t('questions.count', { count: asked.length })}</h2>
            <p className="text-fine text-ink-2">{t('questions.note')}</p>
          </div>
          <div className="grid content-start gap-5 lg:grid-cols-[repeat(auto-fit,minmax(17rem,1fr))]">
            {asked.map((question) => (
              <QuestionField
                key={question.name}
                question={question}
                value={draft[question.name]}
                onChange={(value) => setDraft((before) => ({ ...before, [question.name]: value }))}
                problem={problemOf(question)}
              />
            ))}
          </div>
        </section>
      )}
      {children}
      {error && (
        <p role="alert" className="mt-2 text-small font-emphasis text-terra-ink">
          {problemWords(error)}
        </p>
      )}
    </form>
  );
}
