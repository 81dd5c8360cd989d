'use client';

import { ArrowLeft } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { HelpHead } from '@/components/help/help-head';
import { PrintButton } from '@/components/help/print-button';
import { PageLink } from '@/components/navigation/page-link';
import { Callout } from '@/components/ui/callout';
import { textLink } from '@/components/ui/text-link';
import { SheetProvider } from '@/components/week-sheet/sheet-context';
import { instantOf } from '@/components/week-sheet/sheet-times';
import { longDay, timeOfDay } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import type { HouseSheet } from '@/lib/schemas/house-sheet';
import { SheetCalls } from './sheet-calls';
import { SheetDoses } from './sheet-doses';
import { SheetFor } from './sheet-for';
import { SheetPlaces } from './sheet-places';
import { SheetDaily, SheetTrouble } from './sheet-rules';
import { SheetTests } from './sheet-tests';
import { useNothingToAdd } from './use-nothing-to-add';

/** One page, on A4 and Letter, for whoever looks after the pool while the household is away. */
export function HouseSheetPage({ sheet }: { sheet: HouseSheet }) {
  return (
    <SheetProvider sheet={sheet.week} start={undefined} onPaper>
      <OnePage sheet={sheet} />
    </SheetProvider>
  );
}

function OnePage({ sheet }: { sheet: HouseSheet }) {
  const t = useTranslations('house.sheet');
  const nothing = useNothingToAdd(sheet);
  const common = useTranslations('common');
  const { week, notes, handler, handlers, openDoses } = sheet;
  const { timeZone, locale, name } = week.household;
  const when = (iso: string) => {
    const instant = instantOf(iso);
    return `${longDay(dayOf(instant, timeZone), locale)}, ${timeOfDay(instant, timeZone, locale)}`;
  };
  const good = week.plan === null || nothing !== null ? t('goodCalls') : t('good', { when: when(week.plan.endsAt) });
  return (
    <div className="mx-auto max-w-sheet px-margin pb-10 print:max-w-none print:pb-0">
      <PageLink
        href="/house"
        className={`${textLink} inline-flex min-h-11 items-center gap-1.5 text-body print:hidden`}
      >
        <ArrowLeft aria-hidden="true" className="size-4.5" />
        {t('change')}
      </PageLink>
      <HelpHead
        headline={t('title', { household: name })}
        lead={`${t('made', { when: when(week.now) })} ${good}`}
        aside={<PrintButton label={common('print')} />}
      />
      <div className="pt-3 print:pt-1">
        <SheetFor handlers={handlers} handler={handler} />
        {openDoses === 0 ? null : (
          <Callout severity="take-care" word={common('takeCare')} className="mb-4 print:mb-1">
            <p>{t('doses.open', { count: openDoses })}</p>
          </Callout>
        )}
        <div className="md:grid md:grid-cols-2 md:gap-x-9 print:grid print:grid-cols-2 print:gap-x-6">
          <div>
            <SheetCalls notes={notes} locale={locale} />
            <SheetPlaces notes={notes} handlesChemicals={handler !== null} />
            <SheetDaily />
          </div>
          <div>
            <SheetDoses sheet={sheet} />
            {handler === null ? null : <SheetTests week={week} />}
          </div>
        </div>
        <SheetTrouble />
      </div>
    </div>
  );
}
