'use client';

import { lazy, Suspense } from 'react';
import { untilFetched } from '@/components/ui/until-fetched';

const Margin = lazy(() => untilFetched(() => import('./margin')).then((part) => ({ default: part.Margin })));
const TryIt = lazy(() =>
  untilFetched(() => import('@/components/try-out/try-it')).then((part) => ({ default: part.TryIt })),
);

/**
 * The words of these parts come with the page, the code that brings them to life after it. One element of each for every
 * drawing: new props would make React throw the server's words away before that code is there.
 */
export const margin = (
  <Suspense fallback={null}>
    <Margin />
  </Suspense>
);

export const tryIt = (
  <Suspense fallback={null}>
    <TryIt />
  </Suspense>
);
