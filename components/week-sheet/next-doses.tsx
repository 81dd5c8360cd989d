'use client';

import { Bell } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { glyphOf } from '@/components/charts/chart-doses';
import { ProductGlyph } from '@/components/charts/product-glyph';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { nextCheck } from './checks';
import { DoseActions } from './dose-actions';
import { DoseReason } from './dose-reason';
import { mayUndo, nextDose } from './dose-state';
import { DoseSteps } from './dose-steps';
import { MarkedMeasure } from './marked-measure';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useDoseWords } from './use-dose-words';
import { useTimes } from './use-times';

/** The dose that is next with all its steps, and above it what was ticked in the last ten minutes. */
export function NextDoses() {
  const { sheet, picture } = useSheet();
  const next = nextDose(sheet.doses);
  return (
    <>
      {sheet.doses
        .filter((dose) => mayUndo(dose, picture.now, sheet.me))
        .map((dose) => (
          <JustDone key={dose.id} dose={dose} />
        ))}
      {next && <NextDose dose={next} />}
    </>
  );
}

function JustDone({ dose }: { dose: PlanDose }) {
  const words = useDoseWords();
  return (
    <section className="mb-3 border-y border-rule py-3">
      <p className="mb-1 font-strong">{words.amountAndProduct(dose)}</p>
      <DoseActions dose={dose} />
    </section>
  );
}

function NextDose({ dose }: { dose: PlanDose }) {
  const t = useTranslations('doses');
  const words = useDoseWords();
  return (
    <section
      aria-label={words.amountAndProduct(dose)}
      className="rounded-tick border-due border-ink bg-paper-lift px-4 pt-3.25 pb-4"
    >
      <p className="flex flex-wrap items-center justify-between gap-x-3 text-label">
        <b className="inline-flex items-center gap-1.5 text-terra-ink">
          <Bell aria-hidden="true" className="size-4.5" />
          {words.dueOf(dose)}
        </b>
        <CheckBefore dose={dose} />
      </p>
      <p className="mt-2.5 mb-0.5 flex flex-wrap items-end gap-x-3.5">
        <span className="font-display text-dose">{words.amountOf(dose)}</span>
        <span className="inline-flex items-center gap-2.25 font-display text-[23px] leading-7 font-section">
          <ProductGlyph mark={glyphOf(dose.form)} size={18} />
          {words.productOf(dose)}
        </span>
      </p>
      <p className="mt-2 font-strong">{words.hourOf(dose, { pump: true })}</p>
      <MarkedMeasure dose={dose} />
      <DoseReason dose={dose} />
      <section aria-label={t('stepsHeading')} className="mt-2.25 mb-3.5">
        <DoseSteps dose={dose} />
      </section>
      <DoseActions dose={dose} />
    </section>
  );
}

/** "quick check by 19:00, then": a check that comes before the dose on its day. */
function CheckBefore({ dose }: { dose: PlanDose }) {
  const t = useTranslations('week.check');
  const { sheet } = useSheet();
  const times = useTimes();
  const check = nextCheck(sheet.checks);
  if (check === undefined) return null;
  const [checkAt, doseAt] = [instantOf(check.at), instantOf(dose.at)];
  if (checkAt > doseAt || times.dayOf(checkAt) !== times.dayOf(doseAt)) return null;
  return <span>{t(check.kind === 'quick' ? 'quickThen' : 'fullThen', { time: times.clock(checkAt) })}</span>;
}
