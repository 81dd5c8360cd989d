'use client';

import dynamic from 'next/dynamic';
import { untilFetched } from '@/components/ui/until-fetched';
import type { Situations } from '@/lib/schemas/situation';
import type { SituationHousehold } from './situation-household';
import { SituationsScreen } from './situations-screen';

const views = {
  Open: dynamic(() => untilFetched(() => import('./open-situation-view')).then((part) => part.OpenSituationView)),
};

/** The index, with what is open beside it. */
export function SituationIndexScreen(props: { household: SituationHousehold; initial: Situations | undefined }) {
  return <SituationsScreen {...props} views={views} />;
}
