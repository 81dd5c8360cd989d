'use client';

import { useTranslations } from 'next-intl';
import { Dialog } from '@/components/ui/dialog';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { DoseActions } from './dose-actions';
import { DoseSteps } from './dose-steps';
import { DoseReason } from './dose-reason';
import { momentOf } from './dose-state';
import { MarkedMeasure } from './marked-measure';
import { useSheet } from './sheet-context';
import { StopLine } from './stop-line';
import { useAsksStop } from './use-asks-stop';
import { useDoseWords } from './use-dose-words';

/** One dose on a desk: its steps, the Stop, and what may be done about it now. */
export function DoseDialog({
  dose,
  open,
  onOpenChange,
}: {
  dose: PlanDose;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}) {
  const t = useTranslations('doses');
  const common = useTranslations('common');
  const { picture } = useSheet();
  const words = useDoseWords();
  const asksStop = useAsksStop()(dose);
  const moment = momentOf(dose, picture.now);
  const isOpen = moment !== 'done' && moment !== 'skipped';
  return (
    <Dialog
      open={open}
      onOpenChange={onOpenChange}
      title={words.amountAndProduct(dose)}
      description={isOpen ? words.hourOf(dose, { pump: true }) : undefined}
      closeLabel={common('close')}
    >
      <div className="grid gap-3">
        {isOpen && <MarkedMeasure dose={dose} />}
        <DoseReason dose={dose} />
        {isOpen && (
          <section aria-label={t('stepsHeading')}>
            <DoseSteps dose={dose} />
          </section>
        )}
        {!asksStop && <StopLine dose={dose} className="border-y border-rule py-2.5" />}
        <DoseActions dose={dose} />
      </div>
    </Dialog>
  );
}
