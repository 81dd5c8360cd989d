import { useTranslations } from 'next-intl';
import { RequestProblem } from './fetch-json';

/** Turns whatever a request threw into one sentence for the person in front of the screen. */
export function useProblemWords(): (problem: unknown) => string {
  const t = useTranslations('problems');
  return (problem) => t(problem instanceof RequestProblem ? problem.code : 'unexpected');
}
