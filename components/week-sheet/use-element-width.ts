'use client';

import { useCallback, useState } from 'react';

/** Width of an element [px], 0 before it is laid out. Give the returned function to the element as its ref. */
export function useElementWidth(): [width: number, ref: (element: HTMLElement | null) => (() => void) | undefined] {
  const [width, setWidth] = useState(0);
  const ref = useCallback((element: HTMLElement | null) => {
    if (element === null) return undefined;
    const observer = new ResizeObserver(() => setWidth(element.getBoundingClientRect().width));
    observer.observe(element);
    setWidth(element.getBoundingClientRect().width);
    return () => observer.disconnect();
  }, []);
  return [width, ref];
}
