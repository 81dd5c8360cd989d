'use client';

import { useSyncExternalStore } from 'react';

const never = () => () => {};

/** False on the server and in the first paint, true once React listens. */
export function useHydrated(): boolean {
  return useSyncExternalStore(
    never,
    () => true,
    () => false,
  );
}
