'use client';

import { ChevronLeft, ChevronRight } from 'lucide-react';
import Link from 'next/link';
import { useTranslations } from 'next-intl';
import { addDays } from '@/lib/calendar/household-day';
import { useSheet } from './sheet-context';

const step =
  'flex size-9 items-center justify-center rounded border-control border-edge hover:bg-paper-lift pointer-coarse:size-11';

/** To the week before and the week after, and back to the week of now. */
export function WeekNavigation() {
  const t = useTranslations('week');
  const { sheet, start } = useSheet();
  const first = sheet.days[0]?.day;
  if (first === undefined) return null;
  return (
    <nav aria-label={t('weeks')} className="mt-2.5 flex items-center gap-2 text-small">
      <Link href={`/week?start=${addDays(first, -7)}`} className={step} aria-label={t('previousWeek')}>
        <ChevronLeft aria-hidden="true" className="size-5" />
      </Link>
      <Link href={`/week?start=${addDays(first, 7)}`} className={step} aria-label={t('nextWeek')}>
        <ChevronRight aria-hidden="true" className="size-5" />
      </Link>
      {start !== undefined && (
        <Link
          href="/week"
          className="inline-flex min-h-9 items-center px-1 underline underline-offset-3 pointer-coarse:min-h-11"
        >
          {t('thisWeek')}
        </Link>
      )}
    </nav>
  );
}
