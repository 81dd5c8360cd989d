'use client';

import { useTranslations } from 'next-intl';
import { Callout } from '@/components/ui/callout';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { useSheet } from './sheet-context';
import { type Sentence, usePlanWords } from './use-plan-words';

/** Why the plan is as it is; what it does not keep comes first. */
export function WhyThisMix() {
  const t = useTranslations('week.why');
  const { plan } = useSheet().sheet;
  return (
    <section className="pb-3 lg:border-b lg:border-rule">
      <h2 className="mb-1.5 font-display text-section">{t('title')}</h2>
      {plan === null || !explains(plan) ? <p className="text-ink-2">{t('none')}</p> : <Reasons plan={plan} />}
    </section>
  );
}

/** A plan without a cost compared nothing; but an open situation says why nothing is dosed. */
function explains({ cost, reasons }: NonNullable<WeekSheet['plan']>): boolean {
  return cost !== null || reasons.some(({ code }) => code.startsWith('situation-'));
}

function Reasons({ plan }: { plan: NonNullable<WeekSheet['plan']> }) {
  const t = useTranslations('week.why');
  const common = useTranslations('common');
  const { reasons, cautions, broken } = usePlanWords(plan);
  return (
    <div className="grid gap-3">
      {broken.length > 0 && (
        <Callout severity="take-care" word={common('takeCare')} title={t('broken')}>
          <Sentences sentences={broken} />
        </Callout>
      )}
      <p className="text-body text-pretty">{reasons.map(({ words }) => words).join(' ')}</p>
      {cautions.length > 0 && (
        <Callout severity="note" word={common('note')} title={t('cautions')}>
          <Sentences sentences={cautions} />
        </Callout>
      )}
    </div>
  );
}

function Sentences({ sentences }: { sentences: readonly Sentence[] }) {
  return (
    <ul className="mt-1 grid gap-1.5">
      {sentences.map(({ code, words }) => (
        <li key={code}>{words}</li>
      ))}
    </ul>
  );
}
