'use client';

import { useTranslations } from 'next-intl';
import { instantOf } from '@/components/week-sheet/sheet-times';
import { longDay } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { SheetSection } from './sheet-section';

/** The tests that the plan asks for in the days ahead; nothing where it asks for none. */
export function SheetTests({ week }: { week: WeekSheet }) {
  const t = useTranslations('house.sheet.tests');
  const { timeZone, locale } = week.household;
  const ahead = week.checks.filter(({ at, done }) => !done && instantOf(at) > instantOf(week.now));
  if (week.plan === null || week.plan.stale || ahead.length === 0) return null;
  return (
    <SheetSection id="sheet-tests" title={t('title')}>
      <ul className="mt-1 text-body">
        {ahead.map(({ at, kind }) => (
          <li key={`${at} ${kind}`}>
            <b>{longDay(dayOf(instantOf(at), timeZone), locale)}</b> {t(kind)}
          </li>
        ))}
      </ul>
    </SheetSection>
  );
}
