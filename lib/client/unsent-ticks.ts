import { useCallback, useSyncExternalStore } from 'react';
import type { SentTick } from './doses';

type Checked = typeof import('./checked-ticks').checkedTicks;

/** What checks ticks of an earlier page comes with zod, and only where there are any; until then there are none. */
let checked: Checked | undefined;
const nothing: readonly SentTick[] = [];
const none = '[]';

/**
 * Ticks that could not be sent, kept on this device for one person until they are. Reading gives the same array as long as
 * nothing has changed, as React asks of a store.
 */
const cache = new Map<string, { text: string; ticks: readonly SentTick[] }>();
const listeners = new Set<() => void>();

export function useUnsentTicks(personId: string): readonly SentTick[] {
  const subscribe = useCallback((listener: () => void) => listen(personId, listener), [personId]);
  return useSyncExternalStore(
    subscribe,
    () => unsentTicks(personId),
    () => nothing,
  );
}

export function unsentTicks(personId: string): readonly SentTick[] {
  const text = stored(personId);
  if (text === none) return nothing;
  const known = cache.get(personId);
  if (known?.text === text) return known.ticks;
  if (checked === undefined) return nothing;
  const ticks = checked(parsed(text)) ?? nothing;
  cache.set(personId, { text, ticks });
  return ticks;
}

/** Keeps a tick, the same one once only. @returns whether the device took it: a private window may refuse */
export async function keepTick(personId: string, sent: SentTick): Promise<boolean> {
  if (!(await isRead(personId))) return false;
  const others = unsentTicks(personId).filter(({ tick }) => tick.id !== sent.tick.id);
  return store(personId, [...others, sent]);
}

export async function forgetTick(personId: string, tickId: string): Promise<void> {
  if (!(await isRead(personId))) return;
  store(
    personId,
    unsentTicks(personId).filter(({ tick }) => tick.id !== tickId),
  );
}

/** Whether what is kept is known: what this page kept itself needs no check. */
async function isRead(personId: string): Promise<boolean> {
  const text = stored(personId);
  return text === none || cache.get(personId)?.text === text || canCheck();
}

async function canCheck(): Promise<boolean> {
  try {
    checked ??= (await import('./checked-ticks')).checkedTicks;
    return true;
  } catch {
    return false;
  }
}

function store(personId: string, ticks: readonly SentTick[]): boolean {
  const text = JSON.stringify(ticks);
  try {
    window.localStorage.setItem(keyOf(personId), text);
  } catch {
    return false;
  }
  cache.set(personId, { text, ticks });
  tellAll();
  return true;
}

function tellAll(): void {
  listeners.forEach((listener) => listener());
}

function stored(personId: string): string {
  try {
    return window.localStorage.getItem(keyOf(personId)) ?? none;
  } catch {
    return none;
  }
}

function listen(personId: string, listener: () => void): () => void {
  listeners.add(listener);
  if (checked === undefined && stored(personId) !== none) void canCheck().then(tellAll);
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
