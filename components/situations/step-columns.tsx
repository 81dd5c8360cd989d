'use client';

import { useTranslations } from 'next-intl';
import type { OpenSituation } from '@/lib/schemas/situation';
import { LaneGrid } from './lane-grid';
import { useHousehold } from './situation-context';
import type { StepDay } from './step-days';
import { StepRow } from './step-row';

/** The steps, each day under its own hours. */
export function StepColumns({ open, days, now }: { open: OpenSituation; days: readonly StepDay[]; now: number }) {
  const t = useTranslations('situations.steps');
  const { mayOpen } = useHousehold();
  return (
    <section aria-label={t('label')} className="border-t-todo border-ink pb-2">
      <LaneGrid
        days={days}
        name={
          <div className="pt-3">
            <h2 className="font-display text-name">{t('label')}</h2>
            <p className="mt-1 text-fine text-ink-2">{t(mayOpen ? 'note' : 'noteViewer')}</p>
          </div>
        }
      >
        {({ day, steps }) => (
          <ul className="px-2.25 pt-1.5">
            {steps.map((step) => (
              <li key={`${day} ${step.id}`}>
                <StepRow open={open} step={step} now={now} />
              </li>
            ))}
          </ul>
        )}
      </LaneGrid>
    </section>
  );
}
