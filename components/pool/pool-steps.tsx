'use client';

import { useQuery } from '@tanstack/react-query';
import { useRouter } from 'next/navigation';
import { useTranslations } from 'next-intl';
import { useEffect, useState } from 'react';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { useHydrated } from '@/components/ui/use-hydrated';
import { setupOptions } from '@/lib/client/pools';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { SetupState, SetupStep } from '@/lib/schemas/pool-profile';
import { LabelStep } from './label-step';
import { LiningStep } from './lining-step';
import { ScopeStep } from './scope-step';
import { ScopeStop } from './scope-stop';
import { type PoolHousehold, type PoolPlace, PoolSettingProvider } from './setting';
import { ShelfStep } from './shelf-step';
import { SizeStep } from './size-step';
import { addressOf } from './step-address';
import { isOpen, stoppingStep } from './step-order';
import { SunStep } from './sun-step';
import { WaterStep } from './water-step';

export type PoolStepsProps = { household: PoolHousehold; place: PoolPlace; step: SetupStep };

/** One step of describing the pool, in the first run or opened again from the profile. */
export function PoolSteps({ household, place, step }: PoolStepsProps) {
  const t = useTranslations('first-run');
  const common = useTranslations('common');
  const words = useProblemWords();
  // Drafts live on the device, which the server does not know.
  const hydrated = useHydrated();
  const setup = useQuery(setupOptions());

  const Content = place === 'first-run' ? 'main' : 'div';
  if (!household.mayChange)
    return (
      <Content className="mx-auto block max-w-reading px-margin py-8">
        <h1 className="font-display text-board">{t('notYoursTitle')}</h1>
        <p className="mt-2 text-body text-ink-2">{t('notYours')}</p>
      </Content>
    );
  if (setup.isError && setup.data === undefined)
    return (
      <Content className="block px-margin py-8">
        <ProblemState
          title={t('notLoaded')}
          action={<Button onClick={() => void setup.refetch()}>{common('tryAgain')}</Button>}
        >
          {words(setup.error)}
        </ProblemState>
      </Content>
    );
  if (!hydrated || setup.data === undefined)
    return (
      <Content className="block px-margin py-8">
        <Skeleton label={common('loading')} className="h-72" />
      </Content>
    );
  return (
    <PoolSettingProvider household={household} place={place}>
      <OpenStep state={setup.data} step={step} place={place} />
    </PoolSettingProvider>
  );
}

/** The step itself, unless the answers so far say that Wadewell is not for this pool. */
function OpenStep({ state, step, place }: { state: SetupState; step: SetupStep; place: PoolPlace }) {
  const router = useRouter();
  // The answers that the person has chosen to change; others that stop say so again.
  const [changing, setChanging] = useState<SetupState | null>(null);
  const stop = stoppingStep(state);
  const stopped = stop !== undefined && changing !== state;
  const ahead = !isOpen(step, state);

  // The stop stands on the step whose answer it is about: there "Change an answer" only has to open it.
  const where = stopped ? stop : ahead ? state.nextStep : step;

  useEffect(() => {
    if (where !== null && where !== step) router.replace(addressOf(where, place));
  }, [where, step, place, router]);

  if (stopped) return <ScopeStop decision={state.decision} place={place} onChange={() => setChanging(state)} />;
  if (ahead) return null;
  switch (step) {
    case 'scope':
      return <ScopeStep state={state} />;
    case 'size':
      return <SizeStep state={state} />;
    case 'lining':
      return <LiningStep state={state} />;
    case 'sun':
      return <SunStep state={state} />;
    case 'water':
      return <WaterStep state={state} />;
    case 'shelf':
      return <ShelfStep />;
    case 'label':
      return <LabelStep state={state} />;
  }
}
