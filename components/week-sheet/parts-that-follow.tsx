'use client';

import { Activity, lazy, Suspense, useState } from 'react';
import { untilFetched } from '@/components/ui/until-fetched';
import { useHydrated } from '@/components/ui/use-hydrated';

const Margin = lazy(() => untilFetched(() => import('./margin')).then((part) => ({ default: part.Margin })));
const TryIt = lazy(() =>
  untilFetched(() => import('@/components/try-out/try-it')).then((part) => ({ default: part.TryIt })),
);

/**
 * The words of these parts come with the page, the code that brings them to life after it. One element of each for every
 * drawing: new props would make React throw the server's words away before that code is there.
 */
export const margin = (
  <Follows>
    <Margin />
  </Follows>
);

export const tryIt = (
  <Follows>
    <TryIt />
  </Follows>
);

/** A server would send what stands in Suspense at the end of the page, where nobody sees it before the scripts. */
function Follows({ children }: { children: React.ReactNode }) {
  const hydrated = useHydrated();
  const [part] = useState(hydrated ? <Suspense fallback={null}>{children}</Suspense> : <Activity>{children}</Activity>);
  return part;
}
