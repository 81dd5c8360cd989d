'use client';

import { useSyncExternalStore } from 'react';

const never = () => () => {};

/**
 * False on the server and in the first paint, true once React listens.
 *
 * @param asked false for who need not know: it is true from the start then, and nothing is drawn twice
 */
export function useHydrated(asked = true): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => !asked,
  );
}
