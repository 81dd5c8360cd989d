'use client';

import { TriangleAlert } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import type { Doubt } from './doubts';
import { useDoubtWords } from './use-doubt-words';
import { useValueWords } from './use-value-words';

export type DoubtAnswersProps = {
  doubt: Doubt;
  /** Writes what was probably meant into the field. */
  onLikely: (value: number) => void;
  /** It is right as it stands. */
  onConfirm: () => void;
  /** Takes the value out again: not measured. */
  onClear: () => void;
};

/** Below a doubtful value: what is impossible can only be changed, what is rare is a question on care wash. */
export function DoubtAnswers({ doubt, onLikely, onConfirm, onClear }: DoubtAnswersProps) {
  const t = useTranslations('readings.doubt');
  const words = useValueWords();
  const sentence = useDoubtWords();
  const likely = 'likely' in doubt ? doubt.likely : undefined;
  const offer =
    likely === undefined ? null : (
      <Button variant="primary" onClick={() => onLikely(likely)}>
        {t('likely', { value: words.figure(likely, doubt.quantity) })}
      </Button>
    );
  // The field itself says what is wrong with it.
  if (doubt.kind === 'outside' || doubt.kind === 'unreadable')
    return offer === null ? null : <div className="mt-2">{offer}</div>;
  return (
    <div
      role="group"
      aria-label={t('label', { name: words.name(doubt.quantity) })}
      className="mt-2 border-l-care border-ochre-ink bg-care-wash px-3 pt-2.5 pb-3"
    >
      <p className="flex gap-2 text-body">
        <TriangleAlert aria-hidden="true" className="mt-px size-5 shrink-0 text-ochre-ink" />
        <span>{sentence(doubt)}</span>
      </p>
      <div className="mt-2 flex flex-wrap gap-2 pl-7">
        {offer}
        {doubt.kind === 'unlikely' ? (
          <Button className="bg-paper-lift!" onClick={onConfirm}>
            {t('confirm', { value: words.figure(doubt.value, doubt.quantity) })}
          </Button>
        ) : (
          <Button className="bg-paper-lift!" onClick={onClear}>
            {t('leaveTotal')}
          </Button>
        )}
      </div>
    </div>
  );
}
