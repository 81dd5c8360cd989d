'use client';

import { useSyncExternalStore } from 'react';

const query = '(max-width: 599.98px)';

/** Whether the page is narrower than a sheet of columns can be; undefined on the server, which cannot know. */
export function useIsPhone(): boolean | undefined {
  return useSyncExternalStore(
    listen,
    () => window.matchMedia(query).matches,
    () => undefined,
  );
}

function listen(listener: () => void): () => void {
  const media = window.matchMedia(query);
  media.addEventListener('change', listener);
  return () => media.removeEventListener('change', listener);
}
