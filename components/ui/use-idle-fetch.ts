import { useEffect } from 'react';

/** For browsers that do not say when they are idle [ms]. */
const A_WHILE = 2000;

/**
 * Fetches code for what will be opened later, when the page is drawn and nothing else is to be done: so that it opens at once,
 * and without a connection. The function has to be the same at each call.
 */
export function useIdleFetch(load: () => Promise<unknown>): void {
  useEffect(() => {
    // Without an answer it is asked for again when it is opened.
    const begin = () => void load().catch(() => undefined);
    if (!('requestIdleCallback' in window)) {
      const timer = setTimeout(begin, A_WHILE);
      return () => clearTimeout(timer);
    }
    const idle = window.requestIdleCallback(begin);
    return () => window.cancelIdleCallback(idle);
  }, [load]);
}
