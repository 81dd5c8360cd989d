'use client';

import { useTranslations } from 'next-intl';
import { InlineStop, StopWord } from '@/components/ui/callout';
import { bold } from '@/components/week-sheet/bold';
import { useSheet } from '@/components/week-sheet/sheet-context';
import { instantOf } from '@/components/week-sheet/sheet-times';
import { useDoseWords } from '@/components/week-sheet/use-dose-words';
import { longDay } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import type { HouseSheet } from '@/lib/schemas/house-sheet';
import { SheetSection } from './sheet-section';
import { useMeasured } from './use-measured';
import { useNothingToAdd } from './use-nothing-to-add';

const stop = (words: React.ReactNode) => <StopWord>{words}</StopWord>;

/** What goes in and when, for the one who may add it; for everybody else that nothing goes in. */
export function SheetDoses({ sheet }: { sheet: HouseSheet }) {
  const t = useTranslations('house.sheet.doses');
  const nothing = useNothingToAdd(sheet);
  return (
    <SheetSection id="sheet-doses" title={t('title')}>
      {sheet.handler === null ? null : (
        <p className="mt-1 text-body">{t.rich('onlyFor', { name: sheet.handler.name, b: bold })}</p>
      )}
      {nothing === null ? (
        <DoseLines sheet={sheet} />
      ) : (
        <p className="mt-1.5 border-due border-ink px-3 py-2 text-body font-strong">{nothing}</p>
      )}
      {sheet.handler === null ? <p className="mt-1.5 text-body">{t('nobodyWords')}</p> : null}
      <InlineStop className="mt-2 print:mt-1">{t.rich(nothing === null ? 'mix' : 'mixShort', { stop })}</InlineStop>
    </SheetSection>
  );
}

function DoseLines({ sheet }: { sheet: HouseSheet }) {
  const t = useTranslations('house.sheet.doses');
  const words = useDoseWords();
  const measured = useMeasured();
  const { timeZone, locale } = useSheet().sheet.household;
  return (
    <>
      <ul className="mt-1">
        {sheet.doses.map((dose) => (
          <li key={dose.id} className="border-t border-rule py-1.5 text-body print:py-0.5 print:text-small">
            <p>
              {t.rich('when', {
                day: longDay(dayOf(instantOf(dose.at), timeZone), locale),
                hour: words.hourOf(dose, { pump: true }),
                b: bold,
              })}
            </p>
            <p className="font-strong">{t('what', { dose: measured(dose), toBuy: dose.toBuy ? 'yes' : 'no' })}</p>
            <p>{words.afterwards(dose)}</p>
          </li>
        ))}
      </ul>
      <ul className="mt-1 list-disc space-y-0.5 pl-5 text-body print:space-y-0 print:text-small">
        {(['steps', 'measure', 'weather'] as const).map((rule) => (
          <li key={rule}>{t.rich(rule, { b: bold })}</li>
        ))}
      </ul>
    </>
  );
}
