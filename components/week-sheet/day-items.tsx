'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { bold } from './bold';
import type { Check } from './checks';
import { DoneReading } from './done-reading';
import { DoseActions } from './dose-actions';
import { DoseReason } from './dose-reason';
import { mayUndo, nextDose } from './dose-state';
import { DoseSteps } from './dose-steps';
import { MarkedMeasure } from './marked-measure';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { keyOf, type ToDoItem } from './to-do-items';
import { ToDoStep } from './to-do-step';
import { useCheckReason } from './use-check-reason';
import { useDoseWords } from './use-dose-words';
import { useTimes } from './use-times';

/** What is to be done and was done on a day, as a list on a phone. */
export function DayItems({ items }: { items: readonly ToDoItem[] }) {
  return (
    <ul className="grid gap-3">
      {items.map((item) => (
        <li key={keyOf(item)}>
          {item.kind === 'dose' && <ListedDose dose={item.dose} />}
          {item.kind === 'check' && <ListedCheck check={item.check} />}
          {item.kind === 'reading' && <DoneReading reading={item.reading} />}
          {item.kind === 'step' && <ToDoStep step={item.step} />}
        </li>
      ))}
    </ul>
  );
}

/** The dose that is next, and one that can still be undone, have their box at the top; here they are only named. */
function ListedDose({ dose }: { dose: PlanDose }) {
  const { sheet, picture } = useSheet();
  const words = useDoseWords();
  const onTop = nextDose(sheet.doses)?.id === dose.id || mayUndo(dose, picture.now, sheet.me);
  const isOpen = dose.status === 'planned';
  return (
    <div className="grid gap-1.5">
      <p>
        <b>{words.amountAndProduct(dose)}</b>
        {isOpen && <span className="block text-small text-ink-2">{words.hourOf(dose, { pump: true })}</span>}
      </p>
      {isOpen && !onTop && (
        <>
          <MarkedMeasure dose={dose} />
          <DoseReason dose={dose} />
          <DoseSteps dose={dose} />
        </>
      )}
      {!onTop && <DoseActions dose={dose} />}
    </div>
  );
}

function ListedCheck({ check }: { check: Check }) {
  const t = useTranslations('week');
  const times = useTimes();
  const reason = useCheckReason(check);
  return (
    <p>
      {t.rich('check.by', { kind: t(`check.${check.kind}`), time: times.clock(instantOf(check.at)), b: bold })}
      <span className="block text-small text-ink-2">{reason}</span>
      <PageLink href="/test" className="inline-flex min-h-11 items-center underline decoration-1 underline-offset-3">
        {t('next.enter')}
      </PageLink>
    </p>
  );
}
