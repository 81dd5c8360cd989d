'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { Activity } from 'react';
import { Button } from '@/components/ui/button';
import { DoubleRule } from '@/components/ui/double-rule';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { fromPage } from '@/lib/client/from-page';
import { learntOptions } from '@/lib/client/learnt';
import { setupOptions } from '@/lib/client/pools';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { shelfOptions } from '@/lib/client/shelf-products';
import type { HouseholdProduct } from '@/lib/schemas/household-product';
import type { Learnt } from '@/lib/schemas/learnt';
import type { PoolProfile as Described, SetupState } from '@/lib/schemas/pool-profile';
import { LearntSection } from './learnt/learnt-section';
import { PoolHeadline } from './learnt/pool-headline';
import { StillGuesses } from './learnt/still-guesses';
import { ProfileRows } from './profile-rows';
import { SavedDrawing } from './saved-drawing';
import { type PoolHousehold, PoolSettingProvider, usePoolSetting } from './setting';
import { type ProfilePart, useEquipmentRows, usePoolRows } from './use-profile-rows';

type Props = {
  household: PoolHousehold;
  mayForget: boolean;
  /** What the server knew when it made the page. */
  initial?: {
    setup: SetupState | undefined;
    shelf: HouseholdProduct[] | undefined;
    learnt: Learnt | undefined;
  };
};

/** The pool as it was described: drawn where it was measured, and each part open for correction. */
export function PoolProfile({ household, mayForget, initial }: Props) {
  const t = useTranslations('first-run');
  const common = useTranslations('common');
  const words = useProblemWords();
  const setup = useQuery({ ...setupOptions(), ...fromPage(initial?.setup) });
  // Those who show them below find them with the page, too.
  useQuery({ ...shelfOptions(), ...fromPage(initial?.shelf) });
  useQuery({ ...learntOptions(), ...fromPage(initial?.learnt) });
  if (setup.isError && setup.data === undefined)
    return (
      <ProblemState
        className="mx-margin my-8"
        title={t('notLoaded')}
        action={<Button onClick={() => void setup.refetch()}>{common('tryAgain')}</Button>}
      >
        {words(setup.error)}
      </ProblemState>
    );
  if (setup.data === undefined) return <Skeleton label={common('loading')} className="mx-margin my-8 h-72" />;
  return (
    <PoolSettingProvider household={household} place="profile">
      <Profile state={setup.data} mayForget={mayForget} />
    </PoolSettingProvider>
  );
}

/** Only laid out when a phone is scrolled towards it; as wide as the page, for what sticks out of it is cut off. */
const further =
  'min-w-0 max-lg:-mx-margin max-lg:px-margin max-lg:[content-visibility:auto] max-lg:[contain-intrinsic-height:auto_63rem]';

/** Part by part, each in a turn of its own, so that a phone is never busy for long. */
function Profile({ state, mayForget }: { state: SetupState; mayForget: boolean }) {
  const t = useTranslations('pool');
  const { profile, completed } = state;
  const drawing = profile.size?.how === 'measured' ? profile.size : undefined;
  const how = drawing === undefined ? 'entered' : 'drew';
  return (
    <div className="mx-auto max-w-sheet pb-8">
      <div className="px-margin pt-3 pb-3.5 md:border-t md:border-rule">
        <Activity>
          <PoolHeadline volume={profile.volume} how={how} />
        </Activity>
      </div>
      <DoubleRule className="mx-margin" />
      <div className="grid gap-x-7.5 px-margin pt-2 lg:grid-cols-[minmax(0,1fr)_420px]">
        <div className="min-w-0 pt-2">
          {drawing === undefined ? (
            <p className="mb-4 border border-dashed border-rule-2 p-6 text-body text-ink-2">{t('profile.notDrawn')}</p>
          ) : (
            <Activity>
              <SavedDrawing size={drawing} />
            </Activity>
          )}
          <div className="grid gap-x-7.5 border-t border-rule sm:grid-cols-2 sm:*:border-t-0">
            <Activity>
              <Equipment profile={profile} />
            </Activity>
          </div>
          {completed ? (
            <Activity>
              <LearntSection how={how} mayForget={mayForget} />
            </Activity>
          ) : null}
        </div>
        <div className={further}>
          <div className="border-t border-rule lg:border-t-0">
            <Activity>
              <Pool profile={profile} />
              {completed ? <StillGuesses /> : null}
            </Activity>
          </div>
        </div>
      </div>
    </div>
  );
}

/** Stands below the drawing, where there is room for two columns. */
function Equipment({ profile }: { profile: Described }) {
  const { data: shelf = [] } = useQuery(shelfOptions());
  return <Parts parts={useEquipmentRows({ profile, shelf })} />;
}

function Pool({ profile }: { profile: Described }) {
  return <Parts parts={usePoolRows({ profile })} />;
}

function Parts({ parts }: { parts: readonly ProfilePart[] }) {
  const t = useTranslations('pool');
  const { mayChange } = usePoolSetting();
  return parts.map(({ step, rows }) => (
    <ProfileRows
      key={step}
      step={step}
      title={t(`profile.part.${step}`)}
      rows={rows}
      change={mayChange ? t('profile.change') : undefined}
    />
  ));
}
