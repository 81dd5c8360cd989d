import { useTranslations } from 'next-intl';
import type { Catalogue } from './english';

type ProblemCode = keyof Catalogue['problems'];

/** Turns whatever a request threw into one sentence for the person in front of the screen. */
export function useProblemWords(): (problem: unknown) => string {
  const t = useTranslations('problems');
  return (problem) => {
    const code = problem instanceof Error && 'code' in problem ? problem.code : undefined;
    if (typeof code !== 'string' || !t.has(code as ProblemCode)) return t('unexpected');
    // Only the server knows which of many things this person may not do, and it says so in words.
    return code === 'not-allowed' && problem instanceof Error ? problem.message : t(code as ProblemCode);
  };
}
