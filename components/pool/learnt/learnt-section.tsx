'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { Activity } from 'react';
import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { PictureOrTable } from '@/components/ui/picture-or-table';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { dayWithYear } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import { parseInstant } from '@/lib/calendar/wall-time';
import { learntOptions } from '@/lib/client/learnt';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { Learnt } from '@/lib/schemas/learnt';
import { usePoolSetting } from '../setting';
import { taughtRows } from './has-taught';
import { LearntRow } from './learnt-row';
import { StartAgain } from './start-again';
import { useLearntSentence } from './use-learnt-sentence';
import { useLearntTable } from './use-learnt-table';
import { type SizeKnown, useLearntWords } from './use-learnt-words';

/** What the pool has taught, beside what was assumed of it before; and the way to begin anew. */
export function LearntSection({ how, mayForget }: { how: SizeKnown; mayForget: boolean }) {
  const t = useTranslations('learnt');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const query = useQuery(learntOptions());
  return (
    <section aria-labelledby="learnt-title" className="border-t border-ink pt-3.5">
      <div className="flex flex-wrap items-baseline justify-between gap-x-6 pb-2.5">
        <h2 id="learnt-title" className="font-display text-board">
          {t('title')}
        </h2>
        {query.data && taughtRows(query.data).main.length > 0 ? (
          <p className="text-small text-ink-2">{t('legend')}</p>
        ) : null}
      </div>
      {query.data !== undefined ? (
        <Taught learnt={query.data} how={how} mayForget={mayForget} />
      ) : query.isError ? (
        <ProblemState
          title={t('notLoaded')}
          action={<Button onClick={() => void query.refetch()}>{common('tryAgain')}</Button>}
        >
          {problemWords(query.error)}
        </ProblemState>
      ) : (
        <Skeleton label={t('loading')} className="h-72" />
      )}
    </section>
  );
}

function Taught({ learnt, how, mayForget }: { learnt: Learnt; how: SizeKnown; mayForget: boolean }) {
  const t = useTranslations('learnt');
  const { timeZone, locale } = usePoolSetting();
  const words = useLearntWords(learnt, how);
  const { main, more } = taughtRows(learnt);
  const tableOf = useLearntTable(words);
  const rows = [...main, ...more];
  const sentence = useLearntSentence(words)(rows);
  const since = learnt.since === null ? undefined : parseInstant(learnt.since);
  if (main.length === 0)
    return (
      <>
        <p className="max-w-[66ch] border-t border-rule py-3.5 text-body">
          {t('tooEarly', { readings: learnt.readings })}
        </p>
        {learnt.readings === 0 ? null : <StartAgain mayForget={mayForget} />}
      </>
    );
  return (
    <>
      <PictureOrTable
        sentence={sentence}
        seeTable={t('table.see')}
        seePicture={t('table.picture')}
        table={tableOf(rows)}
        picture={
          <>
            {main.map((row) => (
              <Activity key={row.thing}>
                <LearntRow row={row} learnt={learnt} words={words} />
              </Activity>
            ))}
            {more.length === 0 ? null : (
              <Disclosure summary={<span className="font-display text-name">{t('more')}</span>}>
                <Activity>
                  {more.map((row) => (
                    <LearntRow key={row.thing} row={row} learnt={learnt} words={words} />
                  ))}
                </Activity>
              </Disclosure>
            )}
          </>
        }
      />
      <StartAgain mayForget={mayForget} />
      <p className="border-t border-rule pt-2.5 pb-4 text-small text-ink-2">
        {since === undefined ? null : <>{t('since', { day: dayWithYear(dayOf(since, timeZone), locale) })} </>}
        {t('colophon')}
      </p>
    </>
  );
}
