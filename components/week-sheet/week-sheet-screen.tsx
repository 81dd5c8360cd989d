'use client';

import { useQuery } from '@tanstack/react-query';
import dynamic from 'next/dynamic';
import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { part } from '@/components/ui/part';
import { Skeleton } from '@/components/ui/skeleton';
import { untilFetched } from '@/components/ui/until-fetched';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { fromPage } from '@/lib/client/from-page';
import { useUnsentTicks } from '@/lib/client/unsent-ticks';
import { weekSheet } from '@/lib/client/week';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { ClockProvider } from './clock-context';
import { DeskSheet } from './desk-sheet';
import { Masthead } from './masthead';
import { NotRefreshed } from './not-refreshed';
import { PhoneSheet } from './phone-sheet';
import { SheetProvider, useSheet } from './sheet-context';
import { SheetStates } from './sheet-states';
import { instantOf } from './sheet-times';
import { useIsPhone } from './use-is-phone';

const FirstTest = dynamic(() => untilFetched(() => import('./first-test')).then((part) => part.FirstTest));
/** The device alone knows what waits on it; the server never draws it. */
const UnsentNotice = dynamic(() => untilFetched(() => import('./unsent-notice')).then((part) => part.UnsentNotice), {
  ssr: false,
});

type WeekSheetScreenProps = {
  start?: string | undefined;
  /** What the server knew when it made the page. */
  initial?: WeekSheet | undefined;
  /** Whether it was asked for by a phone. */
  onPhone?: boolean;
};

/** The week sheet, fetched and kept fresh. */
export function WeekSheetScreen({ start, initial, onPhone = false }: WeekSheetScreenProps) {
  const t = useTranslations('week');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const query = useQuery({ ...weekSheet(start), ...fromPage(initial) });
  if (query.data === undefined) {
    if (query.isError)
      return (
        <ProblemState
          className="m-margin"
          title={t('notLoaded')}
          action={<Button onClick={() => void query.refetch()}>{common('tryAgain')}</Button>}
        >
          {problemWords(query.error)}
        </ProblemState>
      );
    return <Skeleton label={t('loading')} className="m-margin h-96" />;
  }
  return (
    <ClockProvider now={instantOf(query.data.now)} receivedAt={query.dataUpdatedAt}>
      <SheetProvider sheet={query.data} start={start}>
        {query.isError && <NotRefreshed />}
        <Masthead />
        <div className="mx-margin grid gap-3 empty:hidden sm:my-3">
          <Unsent />
          <SheetStates />
        </div>
        <SheetBody onPhone={onPhone} />
      </SheetProvider>
    </ClockProvider>
  );
}

/** Nothing at all where nothing waits: even an empty place would move the page when it goes. */
function Unsent() {
  const { sheet } = useSheet();
  return useUnsentTicks(sheet.me.id).length > 0 && <UnsentNotice />;
}

// Each comes to life in a turn of its own, and one of them never: see `part`.
const phoneSheet = part(<PhoneSheet />);
const deskSheet = part(<DeskSheet />);

/**
 * The sheet of a desk or that of a phone. Which of the two fits, only the browser knows: unless a phone says what it is, the
 * server draws both, so that either can be read before any script has come, the style sheet shows one, and the other is dropped
 * once React listens.
 */
function SheetBody({ onPhone }: { onPhone: boolean }) {
  const { sheet } = useSheet();
  const narrow = useIsPhone() ?? (onPhone ? true : undefined);
  if (sheet.lastReading === null) return <FirstTest />;
  const both = narrow === undefined;
  return (
    <>
      {narrow !== false && <div className={both ? 'sm:hidden' : undefined}>{phoneSheet}</div>}
      {narrow !== true && <div className={both ? 'max-sm:hidden' : undefined}>{deskSheet}</div>}
    </>
  );
}
