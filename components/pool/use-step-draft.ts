'use client';

import { useState } from 'react';
import { z } from 'zod';
import { readKept, writeKept } from '@/lib/client/device-store';
import type { SetupStep } from '@/lib/schemas/pool-profile';
import { usePoolSetting } from './setting';

export type StepDraft<Draft> = {
  draft: Draft;
  change: (part: Partial<Draft>) => void;
  /** What was typed and what the server holds agree again. */
  settle: (saved: unknown) => void;
};

/**
 * What is typed in one step, kept on this device from the first key on. It is laid over what the server holds, and only as
 * long as that has not changed: a profile corrected on another device wins over an old draft.
 */
export function useStepDraft<Draft extends object>(
  step: SetupStep,
  schema: z.ZodType<Draft>,
  saved: unknown,
  fromSaved: () => Draft,
): StepDraft<Draft> {
  const { id } = usePoolSetting();
  const name = `wadewell.pool.${step}.${id}`;
  const base = JSON.stringify(saved);
  const [draft, setDraft] = useState<Draft>(() => {
    const kept = readKept(name, z.object({ base: z.string(), draft: schema }));
    return kept?.base === base ? kept.draft : fromSaved();
  });
  return {
    draft,
    change: (part) => {
      const next = { ...draft, ...part };
      setDraft(next);
      writeKept(name, { base, draft: next });
    },
    settle: (nowSaved) => {
      writeKept(name, { base: JSON.stringify(nowSaved), draft });
    },
  };
}
