import { useSyncExternalStore } from 'react';
import { z } from 'zod';
import { doseTickSchema } from '@/lib/schemas/plan-dose';
import type { SentTick } from './doses';

const storedSchema = z.array(z.object({ doseId: z.uuid(), tick: doseTickSchema }));
const nothing: readonly SentTick[] = [];

/**
 * Ticks that could not be sent, kept on this device for one person until they are. Reading gives the same array as long as
 * nothing has changed, as React asks of a store.
 */
const cache = new Map<string, { text: string; ticks: readonly SentTick[] }>();
const listeners = new Set<() => void>();

export function useUnsentTicks(personId: string): readonly SentTick[] {
  return useSyncExternalStore(
    listen,
    () => unsentTicks(personId),
    () => nothing,
  );
}

export function unsentTicks(personId: string): readonly SentTick[] {
  const text = stored(personId);
  const known = cache.get(personId);
  if (known?.text === text) return known.ticks;
  const ticks = storedSchema.safeParse(parsed(text)).data ?? nothing;
  cache.set(personId, { text, ticks });
  return ticks;
}

/** Keeps a tick, the same one once only. @returns whether the device took it: a private window may refuse */
export function keepTick(personId: string, sent: SentTick): boolean {
  const others = unsentTicks(personId).filter(({ tick }) => tick.id !== sent.tick.id);
  return store(personId, [...others, sent]);
}

export function forgetTick(personId: string, tickId: string): void {
  store(
    personId,
    unsentTicks(personId).filter(({ tick }) => tick.id !== tickId),
  );
}

function store(personId: string, ticks: readonly SentTick[]): boolean {
  try {
    window.localStorage.setItem(keyOf(personId), JSON.stringify(ticks));
  } catch {
    return false;
  }
  listeners.forEach((listener) => listener());
  return true;
}

function stored(personId: string): string {
  try {
    return window.localStorage.getItem(keyOf(personId)) ?? '[]';
  } catch {
    return '[]';
  }
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

function keyOf(personId: string): string {
  return `wadewell.unsent-ticks.${personId}`;
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return [];
  }
}
