'use client';

import { Check } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { classNames } from '@/components/ui/class-names';
import { VisuallyHidden } from '@/components/ui/visually-hidden';
import type { SituationStep } from '@/lib/schemas/situation';
import { instantOf, useSituationTimes } from './use-situation-times';

/** Who did a step and when; undefined while nobody has. */
export function useDoneBy(now: number) {
  const t = useTranslations('situations.steps');
  const times = useSituationTimes(now);
  return ({ doneAt, doneBy }: SituationStep) =>
    doneAt === null ? undefined : t('doneBy', { by: doneBy ?? 'none', time: times.clock(instantOf(doneAt)) });
}

type Props = { done: boolean; name: string; who: string | undefined; children?: React.ReactNode };

/** A step that is not ticked here: its box only shows whether it is done. */
export function StepWords({ done, name, who, children }: Props) {
  const t = useTranslations('situations.steps');
  return (
    <div className="grid grid-cols-[20px_minmax(0,1fr)] gap-2.5 py-2">
      <span
        aria-hidden="true"
        className={classNames(
          'mt-px flex size-5 items-center justify-center rounded-tick border-[1.6px]',
          done ? 'border-ink bg-ink text-on-ink' : 'border-dashed border-rule-2',
        )}
      >
        {done && <Check className="size-3.5 [stroke-width:3]" />}
      </span>
      <div className="min-w-0 text-body">
        <b className="font-emphasis">{name}</b>
        <VisuallyHidden>{t(done ? 'done' : 'open')}</VisuallyHidden>
        {who !== undefined && <p className="text-small text-ink-2">{who}</p>}
        {children}
      </div>
    </div>
  );
}
