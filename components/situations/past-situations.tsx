'use client';

import { useTranslations } from 'next-intl';
import { dayAndMonth, dayWithYear } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import type { Situations } from '@/lib/schemas/situation';
import { useHousehold } from './situation-context';
import { instantOf } from './use-situation-times';

/** What was open before: its kind, from when to when, and how it ended. */
export function PastSituations({ past }: { past: Situations['past'] }) {
  const t = useTranslations('situations');
  const { timeZone, locale } = useHousehold();
  if (past.length === 0) return null;
  const when = (openedAt: string, endedAt: string) => {
    const [from, to] = [openedAt, endedAt].map((iso) => dayOf(instantOf(iso), timeZone)) as [string, string];
    const end = dayWithYear(to, locale);
    if (from === to) return end;
    const sameYear = from.slice(0, 4) === to.slice(0, 4);
    return t('past.from', { from: sameYear ? dayAndMonth(from, locale) : dayWithYear(from, locale), to: end });
  };
  return (
    <section aria-label={t('past.label')} className="border-t border-ink pt-3">
      <h2 className="font-display text-section">{t('past.label')}</h2>
      <ul className="mt-1">
        {past.map(({ id, kind, openedAt, endedAt, ending, endedBy }) => (
          <li key={id} className="flex flex-wrap justify-between gap-x-6 border-t border-rule py-2 first:border-t-0">
            <b className="font-emphasis">{t(`kind.${kind}.name`)}</b>
            <span className="text-small text-ink-2">
              {t('past.line', {
                when: when(openedAt, endedAt),
                ending: t(`past.ending.${ending}`, { by: endedBy ?? 'none' }),
              })}
            </span>
          </li>
        ))}
      </ul>
    </section>
  );
}
