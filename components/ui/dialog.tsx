'use client';

import { lazy, Suspense } from 'react';
import type { DialogProps } from './dialog-panel';
import { untilFetched } from './until-fetched';
import { useIdleFetch } from './use-idle-fetch';
import { useOpenedOnce } from './use-opened-once';

const fetchPanel = () => import('./dialog-panel');
const Panel = lazy(() => untilFetched(fetchPanel).then(({ DialogPanel }) => ({ default: DialogPanel })));

/** A question that has to be answered before going on. What draws it is fetched once the page stands. */
export function Dialog(props: DialogProps) {
  useIdleFetch(fetchPanel);
  const opened = useOpenedOnce(props.open);
  if (!opened) return null;
  return (
    <Suspense>
      <Panel {...props} />
    </Suspense>
  );
}
