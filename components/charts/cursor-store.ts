'use client';

import { useSyncExternalStore } from 'react';

/** Where the lanes of one sheet are being read, undefined while nobody reads an hour. */
type Cursor = { at: number | undefined; listeners: Set<() => void> };

/** By the name that lanes share. Lanes are loaded apart from each other, so none of them could hold it for the rest. */
const cursors = new Map<string, Cursor>();

function cursorOf(syncId: string): Cursor {
  const known = cursors.get(syncId) ?? { at: undefined, listeners: new Set() };
  cursors.set(syncId, known);
  return known;
}

export function moveCursor(syncId: string, at: number | undefined): void {
  const cursor = cursorOf(syncId);
  if (cursor.at === at) return;
  cursor.at = at;
  for (const listener of cursor.listeners) listener();
}

/** The instant that is being read in the lanes of a sheet [ms]. */
export function useCursor(syncId: string): number | undefined {
  return useSyncExternalStore(
    (listener) => {
      const { listeners } = cursorOf(syncId);
      listeners.add(listener);
      return () => void listeners.delete(listener);
    },
    () => cursorOf(syncId).at,
    () => undefined,
  );
}
