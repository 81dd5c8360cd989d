'use client';

import { RequestProblem } from '@/lib/client/fetch-json';
import { useProblemWords } from '@/lib/messages/use-problem-words';

/** What the server says of a tick it did not take names who and when, which the general words for its code cannot. */
export function useTickProblem(): (problem: unknown) => string {
  const words = useProblemWords();
  return (problem) => {
    if (!(problem instanceof RequestProblem)) return words(problem);
    const { code, problems, message } = problem;
    if (code === 'conflict' || code === 'not-allowed') return message;
    return code === 'invalid-input' ? (problems[0]?.message ?? words(problem)) : words(problem);
  };
}
