import { useEffect } from 'react';
import { whenLeftAlone } from './when-left-alone';

/**
 * Fetches code for what will be opened later, when the page has been drawn for a while or somebody begins to use it: so that it
 * opens at once, and without a connection. The function has to be the same at each call.
 */
export function useIdleFetch(load: () => Promise<unknown>): void {
  useEffect(
    () =>
      whenLeftAlone(() => {
        // Without an answer it is asked for again when it is opened.
        void load().catch(() => undefined);
      }),
    [load],
  );
}
