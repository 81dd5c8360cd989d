'use client';

import { TestTubeDiagonal } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { buttonClass } from '@/components/ui/button-class';
import { longDay } from '@/lib/calendar/format';
import { type Check, nextCheck } from './checks';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';

/** What is to be measured next, and the way there. */
export function NextCheck() {
  const t = useTranslations('week.next');
  const { sheet, picture } = useSheet();
  const times = useTimes();
  const next = nextCheck(sheet.checks);
  const full = nextCheck(sheet.checks, 'full');
  const at = (check: Check) => instantOf(check.at);
  const when = (check: Check) =>
    t(at(check) < picture.now ? 'overdue' : 'when', { day: times.weekday(at(check)), time: times.clock(at(check)) });
  return (
    <section>
      <h2 className="text-small text-ink-2">{t(next?.kind ?? 'none')}</h2>
      <p className="mt-px mb-2.5 font-display text-[20px] leading-[26px] font-section">
        {next ? when(next) : t('noneWhen')}
      </p>
      <PageLink href="/test" className={buttonClass({ size: 'small', className: 'md:min-h-9.5' })}>
        <TestTubeDiagonal aria-hidden="true" className="size-4.5" />
        {t('enter')}
      </PageLink>
      {full && full !== next && (
        <p className="mt-2.25 text-small text-ink-2">
          {t('fullOn', {
            day: longDay(times.dayOf(at(full)), sheet.household.locale),
            time: times.clock(at(full)),
          })}
        </p>
      )}
    </section>
  );
}
