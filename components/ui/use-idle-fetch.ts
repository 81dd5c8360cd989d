import { useEffect } from 'react';

/** So long a page is left alone after it is drawn: on a phone its first seconds belong to whoever looks at it [ms]. */
const A_WHILE = 5000;

/**
 * Fetches code for what will be opened later, when the page has been drawn for a while or somebody begins to use it: so that it
 * opens at once, and without a connection. The function has to be the same at each call.
 */
export function useIdleFetch(load: () => Promise<unknown>): void {
  useEffect(() => {
    const begin = () => {
      stopWaiting();
      // Without an answer it is asked for again when it is opened.
      void load().catch(() => undefined);
    };
    const timer = setTimeout(begin, A_WHILE);
    const uses = ['pointerdown', 'keydown'] as const;
    for (const use of uses) window.addEventListener(use, begin, { passive: true });
    const stopWaiting = () => {
      clearTimeout(timer);
      for (const use of uses) window.removeEventListener(use, begin);
    };
    return stopWaiting;
  }, [load]);
}
