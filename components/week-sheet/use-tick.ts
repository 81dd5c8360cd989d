'use client';

import { useEffect, useRef } from 'react';
import { useTickDose } from '@/lib/client/doses';
import { RequestProblem } from '@/lib/client/fetch-json';
import { forgetTick, keepTick } from '@/lib/client/unsent-ticks';
import type { DoseTick, PlanDose } from '@/lib/schemas/plan-dose';
import { useClock } from './clock-context';
import { useSheet } from './sheet-context';

export type Intention =
  | { action: 'claim' | 'skipped' | 'undo' }
  | { action: 'given'; tabletsLeft?: number }
  | { action: 'changed'; amount: number; tabletsLeft?: number };

/**
 * Says what became of a dose. The id of a tick is made once for each intention: pressing twice, or again after a failure,
 * is still the same tick. What gets no answer is kept on the device.
 */
export function useTick(dose: PlanDose) {
  const { sheet, start } = useSheet();
  const clock = useClock();
  const { mutateAsync, isPending, variables, error } = useTickDose(start);
  const intention = useRef<{ key: string; tick: DoseTick } | undefined>(undefined);
  const sending = useRef(false);
  // The second press of a double click may come before the page shows what the first one did: the next sheet does.
  useEffect(() => {
    sending.current = false;
  }, [sheet]);

  const send = async (wanted: Intention): Promise<void> => {
    if (sending.current || isPending) return;
    sending.current = true;
    // After the dose or its plan has changed, the same words are another intention.
    const key = JSON.stringify([wanted, dose.status, dose.planVersion]);
    if (intention.current?.key !== key)
      intention.current = { key, tick: { ...wanted, id: crypto.randomUUID(), planVersion: dose.planVersion } };
    const { tick } = intention.current;
    try {
      await mutateAsync({ doseId: dose.id, tick });
      intention.current = undefined;
      await forgetTick(sheet.me.id, tick.id);
    } catch (cause) {
      sending.current = false;
      const unheard = cause instanceof RequestProblem && cause.code === 'no-connection';
      // 'I am adding it now' is worth nothing later.
      if (unheard && tick.action !== 'claim')
        await keepTick(sheet.me.id, { doseId: dose.id, tick: pressedAt(tick, clock()) });
    }
  };

  return { send, busy: isPending ? variables.tick.action : undefined, problem: error ?? undefined };
}

export type Tick = ReturnType<typeof useTick>;

/** A tick that arrives late still says when the product went in. */
function pressedAt(tick: DoseTick, instant: number): DoseTick {
  if (tick.action !== 'given' && tick.action !== 'changed') return tick;
  return { ...tick, at: new Date(instant).toISOString() };
}
