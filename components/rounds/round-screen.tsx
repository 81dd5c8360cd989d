'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { Skeleton } from '@/components/ui/skeleton';
import { roundsOptions } from '@/lib/client/rounds';
import { RoundForm } from './round-form';
import type { RoundHousehold } from './round-household';
import { Visits } from './visits';

/** The round of a household; a blank while the last one is fetched. A round can be walked without knowing it. */
export function RoundScreen({ household, serverNow }: { household: RoundHousehold; serverNow: number }) {
  const t = useTranslations('rounds');
  const { data, isPending } = useQuery(roundsOptions());
  if (isPending) return <Skeleton label={t('loading')} className="mx-auto mt-6 h-96 max-w-form" />;
  return (
    <>
      <RoundForm household={household} serverNow={serverNow} known={data ?? { last: null, cleanPressure: null }} />
      <Visits household={household} serverNow={serverNow} />
    </>
  );
}
