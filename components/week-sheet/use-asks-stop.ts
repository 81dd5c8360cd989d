import { useUnsentTicks } from '@/lib/client/unsent-ticks';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { momentOf, tickBar } from './dose-state';
import { useSheet } from './sheet-context';
import { useDosingBar } from './use-dosing-bar';

/**
 * Of which doses this person is asked to read the Stop before anything else: those that may be ticked now. Not while
 * something bars dosing: nobody is to begin then, and what went in all the same is only written down.
 */
export function useAsksStop(): (dose: PlanDose | undefined) => boolean {
  const { sheet, picture } = useSheet();
  const barred = useDosingBar() !== undefined || tickBar(sheet.me) !== undefined;
  const unsent = useUnsentTicks(sheet.me.id);
  return (dose) => {
    if (dose === undefined || !dose.stopDue || barred) return false;
    const moment = momentOf(dose, picture.now);
    return (moment === 'due' || moment === 'claimed') && !unsent.some(({ doseId }) => doseId === dose.id);
  };
}
