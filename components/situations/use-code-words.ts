'use client';

import { useTranslations } from 'next-intl';
import type { Call, Caution, Ending, Headline, Reason, StepCode } from '@/lib/situations/codes';
import { useSituationFigures } from './use-situation-figures';

/**
 * The words of each code of a procedure. A code that this page does not know yet, because it was open while the product
 * changed, has none and is left out.
 */
export function useCodeWords() {
  const t = useTranslations('situations');
  const { standing, inWords } = useSituationFigures();
  const say = (key: Parameters<typeof t.has>[0], figures: Record<string, string | number>) =>
    t.has(key) ? t(key, figures) : undefined;
  return {
    headline: (code: string, figures: Record<string, string | number>) =>
      say(`headline.${code as Headline}`, { ...standing, ...figures }),
    headlineLead: (code: string) => say(`headlineLead.${code as Headline}`, standing),
    branch: (code: string) => say(`branch.${code as 'list'}`, standing),
    caution: (code: string) => ({
      title: say(`caution.${code as Caution}.title`, standing),
      text: say(`caution.${code as Caution}.text`, standing),
    }),
    reason: (fact: { code: string }) => say(`reason.${fact.code as Reason}`, inWords(fact.code, fact)),
    step: (code: string, figures: Readonly<Record<string, unknown>>) => ({
      name: say(`step.${code as StepCode}.name`, inWords(code, figures)),
      note: say(`step.${code as StepCode}.note`, inWords(code, figures)),
    }),
    done: (code: string) => say(`done.${code as Ending}`, standing),
    call: (code: string) => say(`call.${code as Call}`, standing),
  };
}
