'use client';

import { lazy } from 'react';
import { Follows } from '@/components/ui/follows';
import { untilFetched } from '@/components/ui/until-fetched';

const Margin = lazy(() => untilFetched(() => import('./margin')).then((part) => ({ default: part.Margin })));
const TryIt = lazy(() =>
  untilFetched(() => import('@/components/try-out/try-it')).then((part) => ({ default: part.TryIt })),
);

/** The words of these parts come with the page, the code that brings them to life after it. */
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
