'use client';

import { lazy, Suspense } from 'react';
import type { SheetProps } from './sheet-panel';
import { untilFetched } from './until-fetched';
import { useIdleFetch } from './use-idle-fetch';
import { useOpenedOnce } from './use-opened-once';

const fetchPanel = () => import('./sheet-panel');
const Panel = lazy(() => untilFetched(fetchPanel).then(({ SheetPanel }) => ({ default: SheetPanel })));

/** Rises over a phone page from its lower edge, under a double rule. What draws it is fetched once the page stands. */
export function Sheet(props: SheetProps) {
  useIdleFetch(fetchPanel);
  const opened = useOpenedOnce(props.open);
  if (!opened) return null;
  return (
    <Suspense>
      <Panel {...props} />
    </Suspense>
  );
}
