'use client';

import { lazy } from 'react';
import { Follows } from '@/components/ui/follows';
import { untilFetched } from '@/components/ui/until-fetched';
import type { HowPage } from '@/lib/client/worked-out/how-page';

const LiveExample = lazy(() =>
  untilFetched(() => import('./live-example')).then((part) => ({ default: part.LiveExample })),
);

/** The figures of an example come with its page; the functions that work them out again follow. */
export function LaterExample({ page }: { page: HowPage }) {
  return (
    <Follows>
      <LiveExample page={page} />
    </Follows>
  );
}
