'use client';

import { TestTubeDiagonal, TriangleAlert } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import type { TestDraft } from './test-draft-schema';
import { useValueWords } from './use-value-words';
import type { ZeroQuestion } from './zero-question';

type Answer = TestDraft['zeroAnswer'];

/** Zero can mean none, or far too much: asked before the reading counts, and Test first until it is answered. */
export function FalseZero({
  expected,
  answer,
  onAnswer,
  standsAlone = true,
}: {
  expected: ZeroQuestion['expected'];
  answer: Answer;
  onAnswer: (answer: Answer) => void;
  /** Before a test is saved it may be put off, and says itself what holds; afterwards the verdict stands above it. */
  standsAlone?: boolean;
}) {
  const t = useTranslations('readings.zero');
  const words = useValueWords();
  return (
    <section aria-label={t('title')} className="mt-4">
      <div className="grid grid-cols-[30px_1fr] border-l-care border-ochre-ink bg-care-wash py-3 pr-3.5 pl-3 text-body">
        <TriangleAlert aria-hidden="true" className="mt-px size-5.5 text-ochre-ink" />
        <div>
          <h2 className="text-[16.5px] leading-5.5 font-severity">{t('title')}</h2>
          <p>
            {expected === undefined
              ? t('bleaches')
              : t('expected', {
                  low: words.figure(expected.low, 'freeChlorine'),
                  high: words.value(expected.high, 'freeChlorine'),
                })}
          </p>
          <ol className="my-1.5 list-decimal pl-5">
            <li>{t('mix')}</li>
            <li>{t('double')}</li>
          </ol>
          <p className="font-strong">{t('ask')}</p>
          <div className="mt-2 grid grid-cols-2 gap-2.25">
            {(['flashed', 'stayed-pale'] as const).map((value) => (
              <Button
                key={value}
                variant={answer === value ? 'primary' : 'outline'}
                aria-pressed={answer === value}
                className={answer === value ? '' : 'bg-paper-lift!'}
                onClick={() => onAnswer(answer === value ? null : value)}
              >
                {t(`answer.${value}`)}
              </Button>
            ))}
          </div>
          {standsAlone ? (
            <Button
              variant="quiet"
              aria-pressed={answer === 'later'}
              onClick={() => onAnswer(answer === 'later' ? null : 'later')}
            >
              {t('answer.later')}
            </Button>
          ) : null}
        </div>
      </div>
      {standsAlone ? <ZeroState answer={answer} /> : null}
    </section>
  );
}

/** What holds for swimming and dosing while the question is open, and after each answer. */
function ZeroState({ answer }: { answer: Answer }) {
  const t = useTranslations('readings.zero');
  return (
    <div
      role="status"
      className="mt-4 border-t-stop border-b border-ink bg-paper-lift px-3.5 py-3 text-body"
      data-zero-state={answer ?? 'open'}
    >
      <p className="flex items-center gap-2 text-label font-strong">
        <TestTubeDiagonal aria-hidden="true" className="size-5" />
        {t(`state.${answer ?? 'open'}.word`)}
      </p>
      <p className="mt-1 mb-0.5 font-display text-[25px] leading-[30px] font-headline">
        {t(`state.${answer ?? 'open'}.headline`)}
      </p>
      <p>{t(`state.${answer ?? 'open'}.note`)}</p>
    </div>
  );
}
