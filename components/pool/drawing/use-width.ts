'use client';

import { startTransition, useCallback, useState } from 'react';

/** How far below the screen a drawing is made before it is scrolled to [px]. */
const NEAR = '600px';

/**
 * Width of an element [px], so that a drawing is made for the room there is and its words keep their size. Give the returned
 * function to the element as its ref.
 *
 * @param whenNear whether it stays 0 until the element comes near what is seen of the page: its place has to be kept then
 */
export function useWidth(
  initial: number,
  { whenNear = false }: { whenNear?: boolean | undefined } = {},
): [ref: (element: HTMLElement | null) => (() => void) | undefined, width: number] {
  const [width, setWidth] = useState(whenNear ? 0 : initial);
  const ref = useCallback(
    (element: HTMLElement | null) => {
      if (element === null) return undefined;
      if (typeof ResizeObserver === 'undefined') {
        setWidth(initial);
        return undefined;
      }
      let isDrawn = !whenNear;
      const resized = new ResizeObserver(([entry]) => {
        if (!entry || entry.contentRect.width <= 0) return;
        const measured = Math.floor(entry.contentRect.width);
        // Several drawings come near at once, and a phone is not to be busy with them for long; then each keeps to its room.
        if (isDrawn) setWidth(measured);
        else startTransition(() => setWidth(measured));
        isDrawn = true;
      });
      if (!whenNear) {
        resized.observe(element);
        return () => resized.disconnect();
      }
      const seen = new IntersectionObserver(
        (entries) => {
          if (!entries.some(({ isIntersecting }) => isIntersecting)) return;
          seen.disconnect();
          resized.observe(element);
        },
        { rootMargin: NEAR },
      );
      seen.observe(element);
      return () => {
        seen.disconnect();
        resized.disconnect();
      };
    },
    [initial, whenNear],
  );
  return [ref, width];
}
