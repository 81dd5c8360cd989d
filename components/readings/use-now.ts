'use client';

import { useEffect, useState } from 'react';

/**
 * What time it is by the server's clock, moving on while the page is open: the clock of a device may be wrong, and a test
 * is never later than now.
 *
 * @param serverNow when the page was made [ms]
 */
export function useNow(serverNow: number): { now: number; read: () => number } {
  const [ahead] = useState(() => serverNow - Date.now());
  const [now, setNow] = useState(serverNow);
  useEffect(() => {
    const timer = window.setInterval(() => setNow(Date.now() + ahead), 20_000);
    return () => window.clearInterval(timer);
  }, [ahead]);
  return { now, read: () => Date.now() + ahead };
}
