'use client';

import { ArrowRight } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { IngredientMark } from '@/components/pool/ingredient-mark';
import { useDoseWords } from '@/components/week-sheet/use-dose-words';
import { useTimes } from '@/components/week-sheet/use-times';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { PlanChange } from './plan-changes';

/** The visits that changed: what was planned, struck through, and what is planned now. */
export function PlanChangeList({
  changes,
  first,
}: {
  changes: readonly PlanChange[];
  /** There was no plan before: nothing is struck through. */
  first: boolean;
}) {
  const t = useTranslations('readings.saved');
  const times = useTimes();
  const words = useDoseWords();
  const said = (dose: PlanDose | null) => (dose === null ? t('nothing') : words.amountAndProduct(dose));
  return (
    <ul className="mt-1">
      {changes.map(({ before, after, at }) => {
        const dose = after ?? before;
        if (dose === null) return null;
        return (
          <li key={`${at} ${dose.substance}`} className="grid grid-cols-[34px_1fr] border-t border-rule py-3">
            <span className="pt-0.5">
              <IngredientMark substance={dose.substance} form={dose.form} />
            </span>
            <div>
              <p className="text-label text-ink-2">{t('visit', { day: times.weekday(at), time: times.clock(at) })}</p>
              <p className="flex flex-wrap items-center gap-x-2.25 font-display text-[19px] leading-[25px] font-section">
                {first ? null : (
                  <>
                    <s className="font-lead text-ink-2 decoration-[1.5px]">{said(before)}</s>
                    <ArrowRight aria-label={t('becomes')} className="size-4.5" />
                  </>
                )}
                <span>{said(after)}</span>
              </p>
            </div>
          </li>
        );
      })}
    </ul>
  );
}
