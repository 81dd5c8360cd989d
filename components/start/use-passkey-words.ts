import { useTranslations } from 'next-intl';
import { RequestProblem } from '@/lib/client/fetch-json';
import { PasskeyProblem } from '@/lib/client/passkeys';
import { useProblemWords } from '@/lib/messages/use-problem-words';

/** What only the server can tell: the page's own words would speak of a password, or of nothing at all. */
const saidByServer = ['wrong-sign-in', 'conflict', 'not-found'];

/** One sentence for why a passkey was not made or did not sign in: browser, device or server. */
export function usePasskeyWords(): (problem: Error) => string {
  const t = useTranslations('passkeys.problem');
  const words = useProblemWords();
  return (problem) => {
    if (problem instanceof PasskeyProblem) return t(problem.code);
    return problem instanceof RequestProblem && saidByServer.includes(problem.code) ? problem.message : words(problem);
  };
}
