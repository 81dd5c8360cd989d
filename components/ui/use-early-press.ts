'use client';

import { useEffect, useImperativeHandle, useRef } from 'react';
import { UNHEARD } from './early-presses';

/** The ref of a button whose press, made before React listened, is done once it does: once, however often it was pressed. */
export function useEarlyPress(
  outer: React.Ref<HTMLButtonElement> | undefined,
): React.RefObject<HTMLButtonElement | null> {
  const button = useRef<HTMLButtonElement>(null);
  useImperativeHandle(outer, () => button.current as HTMLButtonElement);
  useEffect(() => {
    const { current } = button;
    // React goes on believing that the attribute is there and never writes it again.
    current?.removeAttribute(UNHEARD);
    if (current !== null && window.earlyPresses?.delete(current)) current.click();
  }, []);
  return button;
}
