'use client';

import { type RefObject, useEffect, useState } from 'react';

const touches = ['pointerenter', 'pointerdown', 'focusin'] as const;
/** As soon as it is so near to the window after a scroll. */
const NEAR = '240px';

/**
 * True from when somebody touches an element, enters it with pointer or focus, or scrolls near it: until then nothing that
 * only it needs is loaded.
 */
export function useWanted(ref: RefObject<HTMLElement | null>): boolean {
  const [wanted, setWanted] = useState(false);
  useEffect(() => {
    const element = ref.current;
    if (element === null || wanted) return undefined;
    const ends = new AbortController();
    const want = () => setWanted(true);
    touches.forEach((touch) => element.addEventListener(touch, want, { signal: ends.signal }));
    const watch = () => {
      const watcher = new IntersectionObserver((entries) => entries.some((entry) => entry.isIntersecting) && want(), {
        rootMargin: NEAR,
      });
      watcher.observe(element);
      ends.signal.addEventListener('abort', () => watcher.disconnect());
    };
    window.addEventListener('scroll', watch, { once: true, passive: true, signal: ends.signal });
    return () => ends.abort();
  }, [ref, wanted]);
  return wanted;
}
