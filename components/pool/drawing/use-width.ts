'use client';

import { useLayoutEffect, useRef, useState } from 'react';

/** Width of an element [px], so that a drawing is made for the room there is and its words keep their size. */
export function useWidth<Element extends HTMLElement>(
  initial: number,
): [reference: React.RefObject<Element | null>, width: number] {
  const reference = useRef<Element>(null);
  const [width, setWidth] = useState(initial);
  useLayoutEffect(() => {
    const element = reference.current;
    if (!element || typeof ResizeObserver === 'undefined') return;
    const observer = new ResizeObserver(([entry]) => {
      if (entry && entry.contentRect.width > 0) setWidth(Math.floor(entry.contentRect.width));
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [reference, width];
}
