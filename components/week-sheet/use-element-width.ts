'use client';

import { useCallback, useState } from 'react';

/** How far below the screen something is got ready before it is scrolled to [px]. */
const NEAR = '600px';

/**
 * Width of an element [px], 0 before it is laid out. Give the returned function to the element as its ref.
 *
 * @param whenNear whether it stays 0 until the element comes near what is seen of the page
 */
export function useElementWidth({ whenNear = false }: { whenNear?: boolean } = {}): [
  width: number,
  ref: (element: HTMLElement | null) => (() => void) | undefined,
] {
  const [width, setWidth] = useState(0);
  const ref = useCallback(
    (element: HTMLElement | null) => {
      if (element === null) return undefined;
      const measure = () => setWidth(element.getBoundingClientRect().width);
      const resized = new ResizeObserver(measure);
      const begin = () => {
        resized.observe(element);
        measure();
      };
      if (!whenNear || !('IntersectionObserver' in window)) {
        begin();
        return () => resized.disconnect();
      }
      const seen = new IntersectionObserver(
        (entries) => {
          if (!entries.some(({ isIntersecting }) => isIntersecting)) return;
          seen.disconnect();
          begin();
        },
        { rootMargin: NEAR },
      );
      seen.observe(element);
      return () => {
        seen.disconnect();
        resized.disconnect();
      };
    },
    [whenNear],
  );
  return [width, ref];
}
