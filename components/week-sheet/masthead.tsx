'use client';

import { useTranslations } from 'next-intl';
import { DoubleRule } from '@/components/ui/double-rule';
import { NextCheck } from './next-check';
import { OtherWeek } from './other-week';
import { PoolFacts } from './pool-facts';
import { Verdict } from './verdict';
import { turnsWeeks, WeekTurning } from './week-turning';

/** Whose pool it is, whether it is fine to swim, and what is to be measured next; closed by the double rule. */
export function Masthead() {
  const t = useTranslations('week');
  return (
    <header aria-label={t('title')} {...turnsWeeks}>
      <WeekTurning />
      <OtherWeek />
      <div className="px-margin pt-4.5 pb-4.5 sm:grid sm:grid-cols-2 sm:gap-x-6 md:grid-cols-[200px_minmax(0,1fr)_200px] md:gap-x-0 md:border-t md:border-rule md:pt-0 md:pb-0 lg:grid-cols-[230px_minmax(0,1fr)_268px]">
        <div className="sm:col-span-2 md:order-2 md:col-span-1 md:pt-3 md:pr-5 md:pb-4 md:pl-7">
          <Verdict />
        </div>
        <div className="hidden sm:mt-4 sm:block md:order-1 md:mt-0 md:border-r md:border-rule md:pt-4.25 md:pr-5 md:pb-4">
          <PoolFacts />
        </div>
        <div className="hidden sm:mt-4 sm:block md:order-3 md:mt-0 md:border-l md:border-rule md:pt-4.25 md:pb-4 md:pl-6.5">
          <NextCheck />
        </div>
      </div>
      <DoubleRule className="mx-margin hidden sm:block" />
    </header>
  );
}
