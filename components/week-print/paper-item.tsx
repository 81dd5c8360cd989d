'use client';

import { useTranslations } from 'next-intl';
import { bold } from '@/components/week-sheet/bold';
import type { Check } from '@/components/week-sheet/checks';
import { instantOf } from '@/components/week-sheet/sheet-times';
import type { ToDoItem } from '@/components/week-sheet/to-do-items';
import { useDoseWords } from '@/components/week-sheet/use-dose-words';
import { useStepWords } from '@/components/week-sheet/use-step-words';
import { useTimes } from '@/components/week-sheet/use-times';
import { useUnits } from '@/components/week-sheet/use-units';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { RecordedReading } from '@/lib/schemas/reading';
import type { SituationStep } from '@/lib/schemas/situation';
import { PaperBox, WriteLine } from './paper-box';

/** A thing of the to-do lane on paper: open with a box, done with who and when. */
export function PaperItem({ item }: { item: ToDoItem }) {
  switch (item.kind) {
    case 'dose':
      return item.dose.status === 'planned' ? <OpenDose dose={item.dose} /> : <DoneDose dose={item.dose} />;
    case 'check':
      return <OpenCheck check={item.check} />;
    case 'reading':
      return <DoneReading reading={item.reading} />;
    case 'step':
      return <Step step={item.step} />;
  }
}

function OpenDose({ dose }: { dose: PlanDose }) {
  const t = useTranslations('week-print.toDo');
  const doses = useTranslations('doses');
  const words = useDoseWords();
  const units = useUnits();
  const unit =
    dose.unit === 'tablet' ? doses('tabletsUnit') : units.unitOf(dose.unit === 'g' ? 'mass' : 'liquidVolume');
  return (
    <div className="mt-auto first:mt-0 last:flex last:flex-1 last:flex-col">
      <p>{words.hourOf(dose, { pump: false })}</p>
      <p className="font-display text-[20px] leading-[23px] font-headline tracking-dose">{words.amountOf(dose)}</p>
      <p className="font-strong">{words.productOf(dose)}</p>
      {dose.toBuy && <p>{doses('toBuy')}</p>}
      <div className="mt-auto pt-1">
        <PaperBox label={t('added')} />
        <WriteLine label={unit} />
        <WriteLine label={t('by')} />
      </div>
    </div>
  );
}

function DoneDose({ dose }: { dose: PlanDose }) {
  const words = useDoseWords();
  const skipped = dose.status === 'skipped';
  return (
    <div>
      <p className={`font-strong ${skipped ? 'line-through' : ''}`}>{words.amountAndProduct(dose)}</p>
      <p>{skipped ? words.skippedBy(dose) : words.doneBy(dose)}</p>
    </div>
  );
}

function OpenCheck({ check }: { check: Check }) {
  const t = useTranslations('week');
  const own = useTranslations('week-print.toDo');
  const times = useTimes();
  const time = times.clock(instantOf(check.at));
  const label = t.rich('check.by', { kind: t(`check.${check.kind}`), time, b: bold });
  return (
    <div>
      <PaperBox label={label} />
      {check.kind === 'full' && <p>{own('fullNote')}</p>}
    </div>
  );
}

function DoneReading({ reading }: { reading: RecordedReading }) {
  const t = useTranslations('week');
  const times = useTimes();
  return (
    <div>
      <p className="font-strong">{t(`check.${reading.kind}`)}</p>
      <p>
        {t('check.doneBy', {
          method: t(`method.${reading.method}`),
          by: reading.doneBy ?? 'none',
          time: times.clock(instantOf(reading.takenAt)),
        })}
      </p>
    </div>
  );
}

function Step({ step }: { step: SituationStep }) {
  const words = useStepWords()(step);
  const times = useTimes();
  if (words === undefined) return null;
  if (step.doneAt === null) return <PaperBox label={words} />;
  return (
    <div>
      <p className="font-strong">{words}</p>
      <p>{times.clock(instantOf(step.doneAt))}</p>
    </div>
  );
}
