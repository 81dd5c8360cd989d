'use client';

import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { bold } from './bold';
import { useSheet } from './sheet-context';
import { useStepWords } from './use-step-words';

/** The situation that is open, above the week that it leads: its name, its next step, the way to it. */
export function OpenSituation() {
  const t = useTranslations('week.situation');
  const names = useTranslations('situations.kind');
  const { sheet } = useSheet();
  const words = useStepWords();
  const { situation } = sheet;
  if (!situation) return null;
  const { kind } = situation.situation;
  const { lead, done, steps } = situation.procedure;
  const next = steps.find((step) => step.doneAt === null && words(step) !== undefined);
  return (
    <section aria-label={t('label')} className="mt-3 border-l-care border-teal bg-paper-lift px-4 py-3">
      <p>{t.rich(lead === 'follow' ? 'beside' : 'leads', { name: names(`${kind}.name`), b: bold })}</p>
      <p className="text-small text-ink-2">{done ? t('done') : next ? t('next', { step: words(next) ?? '' }) : ''}</p>
      <PageLink
        href={`/situations/${kind}`}
        className="inline-flex min-h-11 items-center font-emphasis underline decoration-1 underline-offset-3"
      >
        {t('toSteps')}
      </PageLink>
    </section>
  );
}
