'use client';

import { useFormatter, useTranslations } from 'next-intl';
import { useDoseWords } from '@/components/week-sheet/use-dose-words';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { instantOf } from '@/components/week-sheet/sheet-times';
import { useTimes } from '@/components/week-sheet/use-times';
import { useUnits } from '@/components/week-sheet/use-units';
import { startOfDay } from '@/lib/calendar/household-day';
import { skies } from '@/lib/client/try-it/skies';
import type { TryOutChanges } from '@/lib/schemas/try-out';

/** What is tried or was taken, as one list: "12 swimmer-hours on Saturday and a clear sky on Sunday". */
export function useChangeWords(): (changes: TryOutChanges) => string {
  const t = useTranslations('try-out.change');
  const format = useFormatter();
  const { sheet } = useSheet();
  const times = useTimes();
  const units = useUnits();
  const words = useDoseWords();
  const dayIn = (day: string) => times.dayInWords(startOfDay(day, sheet.household.timeZone));
  return ({ swimmers, sky, tablets, moves }) => {
    const parts = [
      ...swimmers.map(({ day, swimmerHours }) => t('swimmers', { count: units.number(swimmerHours), day: dayIn(day) })),
      ...(tablets === null ? [] : [t('tablets', { count: tablets })]),
      ...sky.map(({ day, sky: share }) => t(share >= skies.clear ? 'clear' : 'overcast', { day: dayIn(day) })),
      ...moves.map(({ doseId, toDay }) => {
        const dose = sheet.doses.find(({ id }) => id === doseId);
        // A dose of a plan that another one has taken the place of is no longer on the sheet.
        if (dose === undefined)
          return t('someMove', { day: times.weekday(startOfDay(toDay, sheet.household.timeZone)) });
        const before = times.dayInWords(instantOf(dose.at));
        return t('move', { dose: words.amountAndProduct(dose), day: dayIn(toDay), before });
      }),
    ];
    return format.list(parts);
  };
}
