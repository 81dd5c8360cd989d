import { RequestProblem } from '@/lib/client/fetch-json';
import { useProblemWords } from '@/lib/messages/use-problem-words';

/** Why something about people was refused: the server says which of several reasons it was. */
export function useRefusalWords(): (problem: Error) => string {
  const words = useProblemWords();
  return (problem) =>
    problem instanceof RequestProblem && ['conflict', 'not-found'].includes(problem.code)
      ? problem.message
      : words(problem);
}
