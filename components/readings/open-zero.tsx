'use client';

import { useTranslations } from 'next-intl';
import { asNewReading, type SentReading, useCorrectReading } from '@/lib/client/readings';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { FalseZero } from './false-zero';

/** The question about a zero that was saved without an answer: asked until it has one. */
export function OpenZero({
  sheet,
  onAnswered,
}: {
  sheet: WeekSheet | undefined;
  onAnswered: (sent: SentReading) => void;
}) {
  const t = useTranslations('readings.zero');
  const problemWords = useProblemWords();
  const correct = useCorrectReading();
  const open = sheet?.verdict.reasons.some(({ code }) => code === 'false-zero-open') ?? false;
  const reading = sheet?.lastReading;
  if (!open || !reading || reading.values.freeChlorine === undefined) return null;
  return (
    <div className="max-w-[600px] border-b border-rule pb-4">
      <p className="text-body font-strong">{t('stillOpen')}</p>
      <FalseZero
        expected={undefined}
        answer={null}
        standsAlone={false}
        onAnswer={(answer) => {
          if (answer === null || answer === 'later' || correct.isPending) return;
          correct.mutate({ ...asNewReading(reading), zeroAnswer: answer }, { onSuccess: onAnswered });
        }}
      />
      {correct.error === null ? null : <p role="alert">{problemWords(correct.error)}</p>}
    </div>
  );
}
