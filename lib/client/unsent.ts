import { useCallback, useSyncExternalStore } from 'react';

/** Returns what was kept, checked; undefined for anything else than such a list. */
type Check<Item> = (kept: unknown) => readonly Item[] | undefined;

const none = '[]';

/**
 * Lists of what could not be sent, kept on this device until it is. Reading gives the same array as long as nothing has changed,
 * as React asks of a store.
 *
 * @param fetchCheck what checks the things that an earlier page kept comes with zod, and only where there are any; until then
 *   there are none
 */
export function unsentLists<Item>(fetchCheck: () => Promise<Check<Item>>, idOf: (item: Item) => string) {
  const nothing: readonly Item[] = [];
  const cache = new Map<string, { text: string; items: readonly Item[] }>();
  const listeners = new Set<() => void>();
  let check: Check<Item> | undefined;

  function all(key: string): readonly Item[] {
    const text = stored(key);
    if (text === none) return nothing;
    const known = cache.get(key);
    if (known?.text === text) return known.items;
    if (check === undefined) return nothing;
    const items = check(parsed(text)) ?? nothing;
    cache.set(key, { text, items });
    return items;
  }

  /** Keeps a thing, the same one once only. @returns whether the device took it: a private window may refuse */
  async function keep(key: string, item: Item): Promise<boolean> {
    if (!(await isRead(key))) return false;
    return store(key, [...all(key).filter((kept) => idOf(kept) !== idOf(item)), item]);
  }

  async function forget(key: string, id: string): Promise<void> {
    if (!(await isRead(key))) return;
    const items = all(key);
    const others = items.filter((kept) => idOf(kept) !== id);
    if (others.length < items.length) store(key, others);
  }

  /** Whether what is kept is known: what this page kept itself needs no check. */
  async function isRead(key: string): Promise<boolean> {
    const text = stored(key);
    return text === none || cache.get(key)?.text === text || canCheck();
  }

  async function canCheck(): Promise<boolean> {
    try {
      check ??= await fetchCheck();
      return true;
    } catch {
      return false;
    }
  }

  function store(key: string, items: readonly Item[]): boolean {
    const text = JSON.stringify(items);
    try {
      window.localStorage.setItem(key, text);
    } catch {
      return false;
    }
    cache.set(key, { text, items });
    tellAll();
    return true;
  }

  function tellAll(): void {
    listeners.forEach((listener) => listener());
  }

  function listen(key: string, listener: () => void): () => void {
    listeners.add(listener);
    if (check === undefined && stored(key) !== none) void canCheck().then(tellAll);
    // Another tab of the same browser keeps to the same list.
    window.addEventListener('storage', listener);
    return () => {
      listeners.delete(listener);
      window.removeEventListener('storage', listener);
    };
  }

  function useAll(key: string): readonly Item[] {
    const subscribe = useCallback((listener: () => void) => listen(key, listener), [key]);
    return useSyncExternalStore(
      subscribe,
      () => all(key),
      () => nothing,
    );
  }

  return { all, keep, forget, useAll };
}

function stored(key: string): string {
  try {
    return window.localStorage.getItem(key) ?? none;
  } catch {
    return none;
  }
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return [];
  }
}
