'use client';

import { useState } from 'react';

/** Anything that checks what was kept and returns it typed; the zod schemas do. */
type KeptParser<Kept> = { safeParse(value: unknown): { success: true; data: Kept } | { success: false } };

/** What is kept on this device under a name; undefined when there is nothing, or nothing of this form. */
export function readKept<Kept>(name: string, kept: KeptParser<Kept>): Kept | undefined {
  try {
    const text = window.localStorage.getItem(name);
    if (text === null) return undefined;
    const parsed = kept.safeParse(JSON.parse(text));
    return parsed.success ? parsed.data : undefined;
  } catch {
    // Storage that is full, forbidden or garbled only costs the draft.
    return undefined;
  }
}

/** Whether anything is kept under a name, without what checks it. */
export function isKept(name: string): boolean {
  try {
    return window.localStorage.getItem(name) !== null;
  } catch {
    return false;
  }
}

/** Checks that what was kept is one of these words, on a page that has not fetched zod yet. */
export function oneOf<Word extends string>(words: readonly Word[]): KeptParser<Word> {
  return {
    safeParse(value) {
      const data = words.find((word) => word === value);
      return data === undefined ? { success: false } : { success: true, data };
    },
  };
}

/** Returns whether the device took it: a private window may refuse. */
export function writeKept(name: string, value: unknown): boolean {
  try {
    if (value === undefined) window.localStorage.removeItem(name);
    else window.localStorage.setItem(name, JSON.stringify(value));
    return true;
  } catch {
    return false;
  }
}

/**
 * State that survives a reload on this device. Only for what is rendered in the browser: the server has no device.
 *
 * @param name what it is kept under; belongs to one household
 * @param kept checks what was kept by an earlier version
 */
export function useKept<Kept>(name: string, kept: KeptParser<Kept>, initial: () => Kept): [Kept, (next: Kept) => void] {
  const [value, setValue] = useState<Kept>(() => readKept(name, kept) ?? initial());
  const change = (next: Kept) => {
    setValue(next);
    writeKept(name, next);
  };
  return [value, change];
}
