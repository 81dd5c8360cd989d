'use client';

import { createContext, use, useCallback } from 'react';

const ClockContext = createContext<() => number>(() => 0);

/**
 * The server's clock as it goes on since its last reply [ms]. The device's own may be wrong, and a dose is written down
 * with the hour it went in.
 */
export function ClockProvider({
  now,
  receivedAt,
  children,
}: {
  now: number;
  receivedAt: number;
  children: React.ReactNode;
}) {
  const clock = useCallback(() => now + Math.max(0, Date.now() - receivedAt), [now, receivedAt]);
  return <ClockContext value={clock}>{children}</ClockContext>;
}

export function useClock(): () => number {
  return use(ClockContext);
}
