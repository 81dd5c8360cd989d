import { useSyncExternalStore } from 'react';
import type { TriedLevels } from '@/components/charts/tried-levels';

/** What lies over the chlorine lane while something is tried. */
export type TriedLine = {
  levels: TriedLevels;
  meets: { at: number; level: number } | undefined;
};

/**
 * The one line of the page. It stands outside React's tree of the sheet: a new line draws itself and nothing else, neither
 * charts nor lanes.
 */
let line: TriedLine | undefined;
const listeners = new Set<() => void>();

export function showTriedLine(next: TriedLine | undefined): void {
  if (line === next) return;
  line = next;
  listeners.forEach((listener) => listener());
}

export function useTriedLine(): TriedLine | undefined {
  return useSyncExternalStore(
    listen,
    () => line,
    () => undefined,
  );
}

function listen(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
