'use client';

import { useQuery } from '@tanstack/react-query';
import { CalendarDays } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { classNames } from '@/components/ui/class-names';
import { setupOptions } from '@/lib/client/pools';
import { type SetupStep, setupSteps } from '@/lib/schemas/pool-profile';
import { usePoolSetting } from './setting';
import { addressOf } from './step-address';
import { isDone, isOpen, rulerPart } from './step-order';

/** The steps down the left side of a desk; those already answered can be opened again. */
export function StepList({ step }: { step: SetupStep }) {
  const t = useTranslations('first-run');
  const { place } = usePoolSetting();
  const { data: state } = useQuery(setupOptions());
  return (
    <nav aria-label={t('steps')} className="hidden pt-3.5 text-[14.5px] leading-[19px] md:block">
      <ol>
        {setupSteps.map((name) => {
          const current = name === step;
          const open = state !== undefined && isOpen(name, state);
          const done = state !== undefined && isDone(name, state);
          const figure = name === 'label' || rulerPart[name] === 0 ? '' : `${rulerPart[name]}`;
          const words = (
            <>
              <span className={classNames('block', current ? 'font-strong' : 'font-text')}>
                {t(`step.${name}.name`)}
              </span>
              <span className="block text-small text-ink-2">
                {current ? t('step.now') : done ? t('step.done') : t(`step.${name}.takes`)}
              </span>
            </>
          );
          return (
            <li
              key={name}
              aria-current={current ? 'step' : undefined}
              className="grid grid-cols-[24px_1fr] border-t border-rule first:border-t-0"
            >
              <span aria-hidden="true" className="py-2.25 font-display text-[16px] font-headline text-ink-2">
                {figure}
              </span>
              {open && !current ? (
                <PageLink href={addressOf(name, place)} className="block py-2.25 hover:underline">
                  {words}
                </PageLink>
              ) : (
                <span className="py-2.25">{words}</span>
              )}
            </li>
          );
        })}
        {place === 'profile' ? null : (
          <li className="grid grid-cols-[24px_1fr] border-t border-rule py-2.25">
            <CalendarDays aria-hidden="true" className="size-4.25" />
            <span>
              <span className="block">{t('step.week.name')}</span>
              <span className="block text-small text-ink-2">{t('step.week.takes')}</span>
            </span>
          </li>
        )}
      </ol>
    </nav>
  );
}
