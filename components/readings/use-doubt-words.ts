import { useTranslations } from 'next-intl';
import type { Doubt } from './doubts';
import { useValueWords } from './use-value-words';

/** What is said about a doubtful value. */
export function useDoubtWords(): (doubt: Doubt) => string {
  const t = useTranslations('readings.doubt');
  const words = useValueWords();
  return (doubt) => {
    const { quantity } = doubt;
    const name = words.name(quantity);
    switch (doubt.kind) {
      case 'unreadable':
        return t('unreadable');
      case 'outside': {
        const facts = {
          name,
          low: words.figure(doubt.range[0], quantity),
          high: words.value(doubt.range[1], quantity),
        };
        return doubt.likely === undefined
          ? t('outside', facts)
          : t('outsideLikely', { ...facts, likely: words.figure(doubt.likely, quantity) });
      }
      case 'unlikely':
        return t('unlikely', { name, value: words.value(doubt.value, quantity) });
      case 'total-below-free':
        return t('totalBelowFree');
    }
  };
}
