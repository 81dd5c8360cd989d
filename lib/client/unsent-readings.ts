import { useSyncExternalStore } from 'react';
import { z } from 'zod';
import { type NewReading, newReadingSchema } from '@/lib/schemas/reading';
import { type ReadingOwner, unsentReadingsKey } from './unsent-readings-key';

/** A test that has not reached the server; `refusal` says why it will not be taken as it is. */
export type UnsentReading = { reading: NewReading; refusal: string | null };

const keptSchema = z.array(z.object({ reading: newReadingSchema, refusal: z.string().nullable() }));
const nothing: readonly UnsentReading[] = [];

const cache = new Map<string, { text: string; readings: readonly UnsentReading[] }>();
const listeners = new Set<() => void>();

export function useUnsentReadings(owner: ReadingOwner): readonly UnsentReading[] {
  return useSyncExternalStore(
    listen,
    () => unsentReadings(owner),
    () => nothing,
  );
}

/** The same array as long as nothing has changed, as React asks of a store. */
export function unsentReadings(owner: ReadingOwner): readonly UnsentReading[] {
  const key = unsentReadingsKey(owner);
  const text = stored(key);
  const known = cache.get(key);
  if (known?.text === text) return known.readings;
  const readings = keptSchema.safeParse(parsed(text)).data ?? nothing;
  cache.set(key, { text, readings });
  return readings;
}

/** Keeps a test, the same one once only. @returns whether the device took it */
export function keepReading(owner: ReadingOwner, reading: NewReading, refusal: string | null = null): boolean {
  const others = unsentReadings(owner).filter((kept) => kept.reading.id !== reading.id);
  return store(owner, [...others, { reading, refusal }]);
}

export function forgetReading(owner: ReadingOwner, id: string): void {
  store(
    owner,
    unsentReadings(owner).filter(({ reading }) => reading.id !== id),
  );
}

function store(owner: ReadingOwner, readings: readonly UnsentReading[]): boolean {
  try {
    window.localStorage.setItem(unsentReadingsKey(owner), JSON.stringify(readings));
  } catch {
    // A full or forbidden store: the caller says so, and the form keeps what was typed.
    return false;
  }
  listeners.forEach((listener) => listener());
  return true;
}

function listen(listener: () => void): () => void {
  listeners.add(listener);
  // Another tab of the same browser keeps to the same list.
  window.addEventListener('storage', listener);
  return () => {
    listeners.delete(listener);
    window.removeEventListener('storage', listener);
  };
}

function stored(key: string): string {
  try {
    return window.localStorage.getItem(key) ?? '[]';
  } catch {
    return '[]';
  }
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return [];
  }
}
