'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { HelpHead } from '@/components/help/help-head';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { houseNotesOptions } from '@/lib/client/house-notes';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { GoingAway } from './going-away';
import { HouseForm } from './house-form';
import type { HouseHousehold } from './house-household';

/** The notes of a household, and the way to the sheet that is printed from them. */
export function HouseScreen({ household }: { household: HouseHousehold }) {
  const t = useTranslations('house');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const { data, isPending, error, refetch } = useQuery(houseNotesOptions());
  return (
    <div className="mx-auto max-w-sheet px-margin pb-10">
      <HelpHead headline={t('title')} lead={t('lead')} />
      <div className="grid gap-x-9 gap-y-5 pt-3 md:grid-cols-[minmax(0,27rem)_minmax(0,22rem)]">
        <GoingAway />
        <div className="md:order-first">
          {data !== undefined ? (
            <HouseForm household={household} known={data} />
          ) : isPending ? (
            <Skeleton label={t('loading')} className="h-96" />
          ) : (
            <ProblemState
              title={t('notLoaded')}
              action={<Button onClick={() => void refetch()}>{common('tryAgain')}</Button>}
            >
              {problemWords(error)}
            </ProblemState>
          )}
        </div>
      </div>
    </div>
  );
}
