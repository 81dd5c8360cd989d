'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { EmptyState } from '@/components/ui/empty-state';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { fromPage } from '@/lib/client/from-page';
import { situationsOptions } from '@/lib/client/situations';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { OpenSituation, SituationKind, Situations } from '@/lib/schemas/situation';
import type { ClosedSituation } from './closed-situation';
import type { OpenSituationView } from './open-situation-view';
import { PastSituations } from './past-situations';
import { SituationProvider } from './situation-context';
import { SituationHead } from './situation-head';
import type { SituationHousehold } from './situation-household';
import { SituationIndex } from './situation-index';
import { useHeadline } from './use-headline';
import { instantOf } from './use-situation-times';

type Props = {
  household: SituationHousehold;
  /** The page of one kind; undefined on the index, which shows what is open. */
  kind?: SituationKind;
  /** What the server knew when it made the page. */
  initial?: Situations | undefined;
  views: SituationViews;
};

/** What shows one situation: the page of a kind has it at once, the index when one is open. */
export type SituationViews = {
  Open: React.ComponentType<React.ComponentProps<typeof OpenSituationView>>;
  Closed?: React.ComponentType<React.ComponentProps<typeof ClosedSituation>>;
};

/** The situations of a household: the index, and beside it the open one or the one that was asked for. */
export function SituationsScreen({ household, ...page }: Props) {
  return (
    <SituationProvider household={household}>
      <SituationsPage {...page} />
    </SituationProvider>
  );
}

function SituationsPage({ kind, initial, views: { Open, Closed } }: Omit<Props, 'household'>) {
  const query = useQuery({ ...situationsOptions(), ...fromPage(initial) });
  const situations = query.data;
  const [ended, setEnded] = useState(false);
  const shown = kind ?? situations?.open?.situation.kind;
  const open = situations?.open && situations.open.situation.kind === shown ? situations.open : null;
  const onIndex = kind === undefined;
  return (
    <>
      <Head kind={kind} situations={situations} />
      <div className="px-margin pb-6 md:grid md:grid-cols-[230px_minmax(0,1fr)] md:gap-x-7.5 lg:grid-cols-[326px_minmax(0,1fr)]">
        <aside className={onIndex ? '' : 'hidden md:block'}>
          <SituationIndex situations={situations} current={kind} />
        </aside>
        <div
          className={`min-w-0 grid-cols-[minmax(0,1fr)] content-start gap-5 pt-3.5 ${onIndex ? 'hidden md:grid' : 'grid'}`}
        >
          {ended && !open && <Ended />}
          {query.isError && situations === undefined && (
            <NotLoaded retry={() => void query.refetch()} problem={query.error} />
          )}
          {open && situations ? (
            <Open key={open.id} open={open} situations={situations} onEnded={() => setEnded(true)} />
          ) : kind && Closed ? (
            <Closed kind={kind} situations={situations} loading={query.isPending} />
          ) : (
            !query.isError && <NothingOpen known={situations !== undefined} />
          )}
          {!onIndex && situations && <PastSituations past={situations.past} />}
        </div>
        {onIndex && situations && (
          <div className="mt-5 md:col-span-2">
            <PastSituations past={situations.past} />
          </div>
        )}
      </div>
    </>
  );
}

function Head({ kind, situations }: { kind: SituationKind | undefined; situations: Situations | undefined }) {
  const t = useTranslations('situations');
  const page = kind === undefined ? 'index' : 'kind';
  const open = situations?.open ?? null;
  if (open && situations && (kind === undefined || kind === open.situation.kind))
    return <OpenHead page={page} open={open} now={instantOf(situations.now)} />;
  if (kind) return <SituationHead page={page} headline={t(`kind.${kind}.name`)} short />;
  return <SituationHead page={page} headline={t(situations ? 'nothingOpen.title' : 'index')} short />;
}

function OpenHead({ page, open, now }: { page: 'index' | 'kind'; open: OpenSituation; now: number }) {
  const t = useTranslations('situations');
  const { headline = t(`kind.${open.situation.kind}.name`), lead, nextTest } = useHeadline(open, now);
  return <SituationHead page={page} headline={headline} lead={lead} nextTest={nextTest} />;
}

function NothingOpen({ known }: { known: boolean }) {
  const t = useTranslations('situations');
  if (!known) return <Skeleton label={t('loading')} className="h-40" />;
  return (
    <EmptyState title={t('nothingOpen.choose')} level={2}>
      {t('nothingOpen.text')}
    </EmptyState>
  );
}

/** The last thing that is said of a procedure that was just ended. */
function Ended() {
  const t = useTranslations('situations.ends');
  return (
    <p role="status" className="border-l-care border-ink bg-paper-lift px-4 py-3 font-emphasis">
      {t('over')} {t('overTest')}
    </p>
  );
}

function NotLoaded({ retry, problem }: { retry: () => void; problem: unknown }) {
  const t = useTranslations('situations');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  return (
    <ProblemState title={t('notLoaded')} action={<Button onClick={retry}>{common('tryAgain')}</Button>}>
      {problemWords(problem)}
    </ProblemState>
  );
}
