'use client';

import { useFormatter, useTranslations } from 'next-intl';
import { weekdayName } from '@/lib/calendar/format';
import type { ChangeCause, PlanChanges } from '@/lib/schemas/plan-changes';
import { capitalised } from './capitalised';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTimes } from './use-times';
import { useUnits } from './use-units';

/** Keys of a message cannot hold hyphens. */
const causeKeys = {
  'new-reading': 'reading',
  dose: 'dose',
  'week-ahead': 'week',
  pool: 'pool',
  shelf: 'shelf',
  preferences: 'preferences',
  'try-out': 'tryOut',
  learning: 'learning',
  engine: 'engine',
} as const satisfies Record<ChangeCause, string>;

/** What the newest plan changed of the days ahead, and why; nothing once all of them are behind. */
export function WhatChanged() {
  const t = useTranslations('week.changed');
  const { sheet } = useSheet();
  const times = useTimes();
  const { changes } = sheet;
  const format = useFormatter();
  const lineOf = useChangeWords();
  if (changes === null) return null;
  const ahead = changes.doses.filter(({ day }) => day >= times.today);
  if (ahead.length === 0) return null;
  const at = instantOf(changes.at);
  const causes = format.list(changes.causes.map((cause) => t(causeKeys[cause])));
  return (
    <section className="pt-3.5 pb-3 lg:border-b lg:border-rule">
      <h2 className="mb-1.5 font-display text-section">{t('title')}</h2>
      <p className="text-small text-ink-2">
        {t('since', { day: capitalised(times.dayInWords(at)), time: times.clock(at), causes })}
      </p>
      <ul className="mt-1 grid gap-1 text-body">
        {ahead.map((dose) => (
          <li key={`${dose.day} ${dose.substance} ${dose.form}`}>{lineOf(dose)}</li>
        ))}
      </ul>
    </section>
  );
}

function useChangeWords() {
  const t = useTranslations('week.changed');
  const doses = useTranslations('doses');
  const { amount } = useUnits();
  const { locale } = useSheet().sheet.household;
  return ({ day, substance, form, unit, before, after }: PlanChanges['doses'][number]) => {
    const words = (value: number) => {
      const product = doses(`product.${substance}`, { form, count: value });
      return doses('amountAndProduct', { unit, amount: amount(value, unit), product });
    };
    const said = { day: weekdayName(day, locale) };
    if (after === null) return t('dropped', { ...said, dose: words(before ?? 0) });
    if (before === null) return t('added', { ...said, dose: words(after) });
    return t('amount', { ...said, dose: words(after), before: amount(before, unit) });
  };
}
