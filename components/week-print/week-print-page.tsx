'use client';

import { ArrowLeft } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { PrintButton } from '@/components/help/print-button';
import { PageLink } from '@/components/navigation/page-link';
import { DoubleRule } from '@/components/ui/double-rule';
import { part } from '@/components/ui/part';
import { textLink } from '@/components/ui/text-link';
import { SheetProvider } from '@/components/week-sheet/sheet-context';
import type { PrintedWeek } from '@/lib/schemas/printed-week';
import { PaperFoot } from './paper-foot';
import { PaperHow } from './paper-how';
import { PaperLanes } from './paper-lanes';
import { PaperMade } from './paper-made';
import { PaperMasthead } from './paper-masthead';
import { PaperProvider } from './paper-context';
import { paperStateOf } from './paper-state';
import { PaperStop } from './paper-stop';
import { PaperToDo } from './paper-to-do';
import { PaperVerdict } from './paper-verdict';
import { ReadingsTable } from './readings-table';

// Nobody presses anything on paper: what is long comes to life in turns of its own.
const lanes = part(<PaperLanes />);
const toDo = part(<PaperToDo />);
const stop = part(<PaperStop />);
const readings = part(<ReadingsTable />);
const how = part(<PaperHow />);

/** One upright page of A4 or Letter for the pump room; on a screen it looks as it comes out of the printer. */
export function WeekPrintPage({ printed, start }: { printed: PrintedWeek; start: string | undefined }) {
  const t = useTranslations('week-print');
  const common = useTranslations('common');
  return (
    <SheetProvider sheet={printed.week} start={start} onPaper>
      <PaperProvider state={paperStateOf(printed)}>
        <div className="px-margin pb-10 print:p-0">
          <div className="flex flex-wrap items-center justify-between gap-x-8 py-2 print:hidden">
            <PageLink
              href={start === undefined ? '/week' : `/week?start=${start}`}
              className={`${textLink} inline-flex min-h-11 items-center gap-1.5 text-body`}
            >
              <ArrowLeft aria-hidden="true" className="size-4.5" />
              {t('back')}
            </PageLink>
            <PrintButton label={common('print')} />
          </div>
          <div
            role="region"
            aria-label={t('scroll')}
            tabIndex={0}
            className="paper overflow-x-auto text-fine print:overflow-visible"
          >
            <div className="mx-auto w-[700px]">
              <PaperMasthead />
              <DoubleRule />
              <div className="grid grid-cols-[minmax(0,1fr)_300px] gap-x-4 pt-1.5 pb-1">
                <PaperVerdict />
                <PaperMade />
              </div>
              {lanes}
              {toDo}
              {stop}
              <div className="grid grid-cols-[300px_minmax(0,1fr)] gap-x-4 pt-1.5">
                {readings}
                {how}
              </div>
              <PaperFoot notes={printed.notes} />
            </div>
          </div>
        </div>
      </PaperProvider>
    </SheetProvider>
  );
}
