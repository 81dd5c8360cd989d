'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { Callout } from '@/components/ui/callout';
import { buttonClass } from '@/components/ui/button-class';
import { ProblemState } from '@/components/ui/problem-state';
import { longDay } from '@/lib/calendar/format';
import type { MeasuredQuantity } from '@/lib/schemas/measured-range';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { QuestionedTest } from './questioned-test';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';

/**
 * What stands between this sheet and a good plan, said before the sheet itself.
 *
 * @param onCorrect where the newest test stands open for correction right here
 */
export function SheetStates({ onCorrect }: { onCorrect?: () => void }) {
  const { pool, plan, planProblem } = useSheet().sheet;
  return (
    <>
      {planProblem && <PlanProblem problem={planProblem} />}
      {pool.recordOnly && <RecordOnly />}
      <QuestionedTest onCorrect={onCorrect} />
      {plan?.stale && <Stale />}
      {plan && plan.needs.length > 0 && <Needs needs={plan.needs} hasDoses={plan.cost !== null} />}
    </>
  );
}

function PlanProblem({ problem: { code, errorId } }: { problem: NonNullable<WeekSheet['planProblem']> }) {
  const t = useTranslations('week.state');
  const known =
    code === 'plan-refused' || code === 'engine-busy' || code === 'water-out-of-range' ? code : 'unexpected';
  return (
    <ProblemState title={t('problemTitle')}>{t('problem', { why: t(`planProblem.${known}`), errorId })}</ProblemState>
  );
}

function RecordOnly() {
  const t = useTranslations('week.state');
  const common = useTranslations('common');
  return (
    <Callout severity="note" word={common('note')} title={t('recordOnlyTitle')}>
      {t('recordOnly')}
    </Callout>
  );
}

function Stale() {
  const t = useTranslations('week.state');
  const common = useTranslations('common');
  return (
    <Callout severity="take-care" word={common('takeCare')} title={t('staleTitle')} actions={<ToTest />}>
      {t('stale')}
    </Callout>
  );
}

function Needs({ needs, hasDoses }: { needs: NonNullable<WeekSheet['plan']>['needs']; hasDoses: boolean }) {
  const t = useTranslations('week.state');
  const common = useTranslations('common');
  const { locale } = useSheet().sheet.household;
  const times = useTimes();
  const known = (quantity: string): quantity is MeasuredQuantity => t.has(`quantity.${quantity as MeasuredQuantity}`);
  const words = needs.flatMap(({ code, quantity, since }) => {
    if (code === 'false-zero-open' || code === 'chlorine-bleached-test') return [t(`zero.${code}`)];
    if (!known(quantity)) return [];
    if (quantity === 'cyanuricAcid' && since === null && hasDoses) return [t('stabilizerNever')];
    const name = t(`quantity.${quantity}`);
    if (code === 'measured-long-ago' && since !== null)
      return [t('needMonthly', { quantity: name, day: longDay(times.dayOf(instantOf(since)), locale) })];
    if (since === null) return [t('needNever', { quantity: name })];
    return [t('needOld', { quantity: name, day: longDay(times.dayOf(instantOf(since)), locale) })];
  });
  return (
    <Callout
      severity="take-care"
      word={common('takeCare')}
      title={t(hasDoses ? 'needsMoreTitle' : 'needsTitle')}
      actions={<ToTest />}
    >
      <ul className="mt-1 grid gap-1">
        {words.map((sentence) => (
          <li key={sentence}>{sentence}</li>
        ))}
      </ul>
    </Callout>
  );
}

function ToTest() {
  const t = useTranslations('week.next');
  return (
    <PageLink href="/test" className={buttonClass({ variant: 'primary' })}>
      {t('enter')}
    </PageLink>
  );
}
