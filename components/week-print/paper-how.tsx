'use client';

import { useTranslations } from 'next-intl';
import { capitalised } from '@/components/week-sheet/capitalised';
import { nextDose } from '@/components/week-sheet/dose-state';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { useAsksStop } from '@/components/week-sheet/use-asks-stop';
import { stepTextOf, useDoseSteps } from '@/components/week-sheet/use-dose-steps';
import { useDoseWords } from '@/components/week-sheet/use-dose-words';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { usePaper } from './paper-context';

/** The steps of the next dose; all ways of a week would not fit, so the others are named. */
export function PaperHow() {
  const t = useTranslations('week-print.how');
  const week = useTranslations('week');
  const { sheet } = useSheet();
  const { mayAdd } = usePaper();
  const nameOf = useWayName();
  const next = nextDose(sheet.doses);
  if (!mayAdd || next === undefined) return null;
  const open = sheet.doses.filter(({ status }) => status === 'planned');
  const others = new Set(open.map(nameOf).filter((name) => name !== nameOf(next)));
  return (
    <section>
      <h2 className="font-display text-section">{nameOf(next)}</h2>
      <Steps dose={next} />
      {others.size > 0 && <p className="mt-1">{t('others', { list: [...others].join(week('listJoiner')) })}</p>}
    </section>
  );
}

function Steps({ dose }: { dose: PlanDose }) {
  const t = useTranslations('week-print.how');
  const steps = useDoseSteps();
  const asksStop = useAsksStop();
  if (asksStop(dose)) return <p className="text-small font-strong">{t('stopFirst')}</p>;
  return (
    <ol className="text-small">
      {steps(dose).map(({ number, words }) => (
        <li key={number} className="grid grid-cols-[16px_minmax(0,1fr)]">
          <span aria-hidden="true" className="font-display font-control">
            {number}
          </span>
          <span>{words}</span>
        </li>
      ))}
    </ol>
  );
}

/** "Granules, dissolve first": how a product goes in, as a heading. */
function useWayName(): (dose: PlanDose) => string {
  const t = useTranslations('week-print.how');
  const words = useDoseWords();
  return (dose) => t(stepTextOf(dose), { product: capitalised(words.productOf(dose)) });
}
