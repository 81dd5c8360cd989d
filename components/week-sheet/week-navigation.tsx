'use client';

import { ChevronLeft, ChevronRight } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PageLink } from '@/components/navigation/page-link';
import { useSheet } from './sheet-context';
import { useTimes } from './use-times';
import { isThisWeek, weeksBeside } from './weeks';

const step =
  'flex size-9 items-center justify-center rounded border-control border-edge hover:bg-paper-lift pointer-coarse:size-11';

/**
 * To the week before and the week after, and back to the week of now. The page stays where it is scrolled to, and the
 * link that was pressed stays in focus: whoever goes through the weeks presses it again.
 */
export function WeekNavigation() {
  const t = useTranslations('week');
  const { sheet, picture } = useSheet();
  const { today } = useTimes();
  const first = sheet.days[0]?.day;
  if (first === undefined) return null;
  const { previous, next } = weeksBeside(first, today);
  const isNow = isThisWeek(picture);
  return (
    <nav aria-label={t('weeks')} data-weeks="" className="mt-2.5 flex items-center gap-2 text-small">
      <PageLink
        href={previous}
        scroll={false}
        className={step}
        aria-label={t('previousWeek')}
        title={t('previousWeekKey')}
        aria-keyshortcuts="ArrowLeft"
      >
        <ChevronLeft aria-hidden="true" className="size-5" />
      </PageLink>
      <PageLink
        href={next}
        scroll={false}
        className={step}
        aria-label={t('nextWeek')}
        title={t('nextWeekKey')}
        aria-keyshortcuts="ArrowRight"
      >
        <ChevronRight aria-hidden="true" className="size-5" />
      </PageLink>
      <PageLink
        href="/week"
        scroll={false}
        aria-current={isNow ? 'date' : undefined}
        className={`inline-flex min-h-9 items-center px-1 pointer-coarse:min-h-11 ${isNow ? 'text-ink-2' : 'underline underline-offset-3'}`}
      >
        {t('thisWeek')}
      </PageLink>
    </nav>
  );
}
