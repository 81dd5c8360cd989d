'use client';

import { Check, Minus } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { Tick } from './use-tick';
import { mayUndo } from './dose-state';
import { Doubtful } from './doubtful';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useDoseWords } from './use-dose-words';
import { FoundBefore } from './found-before';
import { useTimes } from './use-times';

/** What became of a dose, and for ten minutes the way back. */
export function DoneDose({ dose, tick }: { dose: PlanDose; tick: Tick }) {
  const t = useTranslations('doses');
  const { sheet, picture } = useSheet();
  const words = useDoseWords();
  const times = useTimes();
  const undo = mayUndo(dose, picture.now, sheet.me);
  return (
    <>
      <p className="flex items-center gap-2 font-emphasis">
        {dose.status === 'skipped' ? (
          <Minus aria-hidden="true" className="size-5" />
        ) : (
          <Check aria-hidden="true" className="size-5" />
        )}
        {dose.status === 'skipped' ? words.skippedBy(dose) : words.doneBy(dose)}
      </p>
      <Doubtful dose={dose} />
      {dose.status === 'changed' && <p className="text-small text-ink-2">{words.changed(dose)}</p>}
      {dose.form === 'tablet' && dose.status !== 'skipped' && <FoundBefore dose={dose} tick={tick} />}
      {undo && (
        <>
          <Button
            wide
            onClick={() => void tick.send({ action: 'undo' })}
            busy={tick.busy === 'undo' ? t('action.undoBusy') : undefined}
          >
            {t('action.undo')}
          </Button>
          <p className="text-small text-ink-2">
            {t('done.undoUntil', { time: times.clock(instantOf(dose.undoUntil ?? '')) })}
          </p>
        </>
      )}
    </>
  );
}
