'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { textLink } from '@/components/ui/text-link';
import { substances, productForms } from '@/lib/schemas/shelf-product';
import { doseUnits } from '@/lib/schemas/dose';
import type { OpenSituation, SituationStep } from '@/lib/schemas/situation';
import { useHousehold } from './situation-context';
import { StepWords, useDoneBy } from './step-words';
import { TickStep } from './tick-step';
import { useCodeWords } from './use-code-words';
import { useSituationFigures } from './use-situation-figures';
import { instantOf, useSituationTimes } from './use-situation-times';

type Props = { open: OpenSituation; step: SituationStep; now: number };

/** One step: ticked here, ticked by a test, or a dose that is ticked on the week sheet. */
export function StepRow({ open, step, now }: Props) {
  switch (step.kind) {
    case 'tick':
      return <HandStep open={open} step={step} now={now} />;
    case 'test':
      return <TestStep open={open} step={step} now={now} />;
    case 'dose':
      return <DoseStep step={step} now={now} />;
  }
}

const stepLink = `inline-flex min-h-11 items-center text-small font-emphasis md:min-h-8 pointer-coarse:min-h-11 ${textLink}`;

/** What a step's words name beside its own figures: who looks after the pool meanwhile. */
function figuresOf({ situation }: OpenSituation, { figures }: SituationStep) {
  return situation.kind === 'away' ? { name: situation.answers.name ?? 'none', ...figures } : figures;
}

function HandStep({ open, step, now }: Props) {
  const t = useTranslations('situations.steps');
  const { mayOpen } = useHousehold();
  const words = useCodeWords();
  const times = useSituationTimes(now);
  const who = useDoneBy(now)(step);
  const { name, note } = words.step(step.code, figuresOf(open, step));
  if (name === undefined) return null;
  if (!mayOpen)
    return (
      <StepWords done={step.doneAt !== null} name={name} who={who}>
        <p className="text-small text-ink-2">{note}</p>
      </StepWords>
    );
  // What is seen on a morning cannot be said the evening before.
  const early = step.code === 'drain-seen' && step.doneAt === null && times.dayOf(instantOf(step.at)) > times.today;
  return (
    <TickStep
      situationId={open.id}
      step={step}
      name={name}
      note={note}
      who={who}
      offReason={early ? t('notBefore') : undefined}
    />
  );
}

function TestStep({ open, step, now }: Props) {
  const t = useTranslations('situations.steps');
  const words = useCodeWords();
  const who = useDoneBy(now)(step);
  const { name, note } = words.step(step.code, figuresOf(open, step));
  if (name === undefined) return null;
  const done = step.doneAt !== null;
  return (
    <StepWords done={done} name={name} who={who}>
      {!done && (
        <>
          <p className="text-small text-ink-2">{note}</p>
          <PageLink href="/test" className={stepLink}>
            {t('toTest')}
          </PageLink>
        </>
      )}
    </StepWords>
  );
}

function DoseStep({ step, now }: { step: SituationStep; now: number }) {
  const t = useTranslations('situations.steps');
  const words = useCodeWords();
  const times = useSituationTimes(now);
  const who = useDoneBy(now)(step);
  const dose = useDoseName(step);
  const { name, note } = words.step(step.code, dose);
  if (name === undefined) return null;
  const { until, toBuy } = step.figures;
  const hours = [
    t('about', { time: times.clock(instantOf(step.at)) }),
    ...(typeof until === 'string' ? [t('pumpUntil', { time: times.clock(instantOf(until)) })] : []),
  ];
  return (
    <StepWords done={step.doneAt !== null} name={name} who={who}>
      {step.doneAt === null && (
        <>
          <p className="text-small">{hours.join(', ')}</p>
          {toBuy === 1 && <p className="text-small font-emphasis">{t('toBuy')}</p>}
          <p className="text-small text-ink-2">{note}</p>
          <PageLink href="/week" className={stepLink}>
            {t('toSheet')}
          </PageLink>
        </>
      )}
    </StepWords>
  );
}

/** "4.6 L" and "liquid chlorine". */
function useDoseName({ figures: { amount, unit, substance, form } }: SituationStep) {
  const t = useTranslations('doses');
  const figures = useSituationFigures();
  const ofUnit = doseUnits.find((each) => each === unit);
  const ofSubstance = substances.find((each) => each === substance);
  const ofForm = productForms.find((each) => each === form) ?? 'other';
  if (typeof amount !== 'number' || ofUnit === undefined || ofSubstance === undefined)
    return { amount: '', product: '' };
  return {
    amount: figures.amount(amount, ofUnit),
    product: t(`product.${ofSubstance}`, { form: ofForm, count: amount }),
  };
}
