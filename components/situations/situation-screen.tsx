'use client';

import type { SituationKind } from '@/lib/schemas/situation';
import { ClosedSituation } from './closed-situation';
import { OpenSituationView } from './open-situation-view';
import type { SituationHousehold } from './situation-household';
import { SituationsScreen } from './situations-screen';

const views = { Open: OpenSituationView, Closed: ClosedSituation };

/**
 * The page of one kind. What is open is fetched by the browser: to know it the week is planned, and the cautions of an accident
 * must not wait for that.
 */
export function SituationScreen(props: { household: SituationHousehold; kind: SituationKind }) {
  return <SituationsScreen {...props} views={views} />;
}
