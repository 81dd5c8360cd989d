'use client';

import { useRouter } from 'next/navigation';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { RequestProblem } from '@/lib/client/fetch-json';
import { useSaveSetup } from '@/lib/client/pools';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { SetupAnswer, SetupState } from '@/lib/schemas/pool-profile';
import { usePoolSetting } from './setting';
import { addressOf } from './step-address';
import { stepAfter, stoppingStep } from './step-order';

/**
 * Saves a step and goes on: to the next one, from the last one to the week sheet, in the profile back to it. Where the
 * answers put the pool out of scope it stays, and the page shows why.
 */
export function useSaveStep(settle: (state: SetupState) => void) {
  const t = useTranslations('pool');
  const words = useProblemWords();
  const router = useRouter();
  const { place } = usePoolSetting();
  const save = useSaveSetup();
  // Stays up while the next page is on its way, so that nothing can be pressed twice.
  const [leaving, setLeaving] = useState(false);

  const send = (answer: SetupAnswer) => {
    save.mutate(answer, {
      onSuccess: (state) => {
        settle(state);
        if (stoppingStep(state) !== undefined) return;
        setLeaving(true);
        router.push(place === 'profile' ? '/pool' : nextAddress(answer, state));
      },
    });
  };

  const lines = save.error instanceof RequestProblem ? save.error.problems.map(({ message }) => message) : [];
  return {
    send,
    busy: save.isPending || leaving,
    problem: save.error === null ? undefined : { title: t('step.notSaved'), lines: [words(save.error), ...lines] },
  };
}

function nextAddress({ step }: SetupAnswer, state: SetupState): string {
  const after = stepAfter(step);
  if (after !== undefined) return addressOf(after, 'first-run');
  return state.nextStep === null ? '/week' : addressOf(state.nextStep, 'first-run');
}
