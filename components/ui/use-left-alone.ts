import { startTransition, useEffect, useState } from 'react';
import { whenLeftAlone } from './when-left-alone';

/** False while the page has just been drawn and nobody uses it yet. */
export function useLeftAlone(): boolean {
  const [alone, setAlone] = useState(false);
  useEffect(() => whenLeftAlone(() => startTransition(() => setAlone(true))), []);
  return alone;
}
