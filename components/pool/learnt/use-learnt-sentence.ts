import { useTranslations } from 'next-intl';
import type { LearntRow } from '@/lib/schemas/learnt';
import { useRowFigures } from './use-figures';
import type { useLearntWords } from './use-learnt-words';

/** The bars in one sentence: of each thing what was assumed, and what it has become. */
export function useLearntSentence(words: ReturnType<typeof useLearntWords>): (rows: readonly LearntRow[]) => string {
  const t = useTranslations('learnt');
  const figuresOf = useRowFigures();
  return (rows) => {
    const things = rows.map((row) => {
      const { figure, withUnit } = figuresOf(row);
      const range = ({ p10, p90 }: LearntRow['before']) =>
        withUnit(t('range', { low: figure(p10), high: figure(p90) }));
      return t('sentenceThing', { name: words.name(row.thing), before: range(row.before), learnt: range(row.learnt) });
    });
    return t('sentence', { things: things.join(t('sentenceJoiner')) });
  };
}
