import { useProblemWords } from '@/lib/messages/use-problem-words';

/** Of these only the server knows what stands in the way, and it says so in words. */
const saidByServer: readonly unknown[] = ['conflict', 'plan-refused', 'invalid-input'];

/** Why something cannot be tried, taken or put back. */
export function useTryProblemWords(): (problem: Error) => string {
  const words = useProblemWords();
  return (problem) => ('code' in problem && saidByServer.includes(problem.code) ? problem.message : words(problem));
}
