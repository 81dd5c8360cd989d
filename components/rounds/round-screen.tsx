'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { Activity } from 'react';
import { Skeleton } from '@/components/ui/skeleton';
import { fromPage } from '@/lib/client/from-page';
import { houseNotesOptions } from '@/lib/client/house-notes';
import { roundsOptions } from '@/lib/client/rounds';
import { visitsOptions } from '@/lib/client/visits';
import type { HouseNotes } from '@/lib/schemas/house-note';
import type { Rounds } from '@/lib/schemas/round';
import type { Visits as NewestVisits } from '@/lib/schemas/visit';
import { RoundForm } from './round-form';
import type { RoundHousehold } from './round-household';
import { Visits } from './visits';

type Props = {
  household: RoundHousehold;
  serverNow: number;
  /** What the server knew when it made the page. */
  initial?: {
    rounds: Rounds | undefined;
    visits: NewestVisits | undefined;
    houseNotes: HouseNotes | undefined;
  };
};

/** The round of a household; a blank while the last one is fetched. A round can be walked without knowing it. */
export function RoundScreen({ household, serverNow, initial }: Props) {
  const t = useTranslations('rounds');
  const { data, isPending } = useQuery({ ...roundsOptions(), ...fromPage(initial?.rounds) });
  // Those who show them below find them with the page, too.
  useQuery({ ...visitsOptions(), ...fromPage(initial?.visits) });
  useQuery({ ...houseNotesOptions(), ...fromPage(initial?.houseNotes) });
  if (isPending) return <Skeleton label={t('loading')} className="mx-auto mt-6 h-96 max-w-form" />;
  // Each comes to life in a turn of its own, so that a phone is never busy for long.
  return (
    <>
      <Activity>
        <RoundForm household={household} serverNow={serverNow} known={data ?? { last: null, cleanPressure: null }} />
      </Activity>
      <Activity>
        <Visits household={household} serverNow={serverNow} />
      </Activity>
    </>
  );
}
