'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { ProfessionalCall } from '@/components/house/professional-call';
import { PageLink } from '@/components/navigation/page-link';
import { Button } from '@/components/ui/button';
import { Disclosure } from '@/components/ui/disclosure';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { textLink } from '@/components/ui/text-link';
import { dayWithYear } from '@/lib/calendar/format';
import { visitsOptions } from '@/lib/client/visits';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { Visits as NewestVisits } from '@/lib/schemas/visit';
import type { RoundHousehold } from './round-household';
import { VisitForm } from './visit-form';

type Props = { household: RoundHousehold; serverNow: number };

/** The professional: the phone, when they were here last, and what was done. */
export function Visits({ household, serverNow }: Props) {
  const t = useTranslations('house.visits');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const { data, isPending, error, refetch } = useQuery(visitsOptions());
  const last = data?.[0];
  return (
    <section aria-labelledby="visits" className="mx-auto max-w-form px-margin pb-8">
      <h2 id="visits" className="border-t border-ink pt-2.5 font-display text-section">
        {t('title')}
      </h2>
      {data !== undefined ? (
        <p className="text-body text-ink-2">
          {last === undefined ? t('none') : t('last', { when: dayWithYear(last.visitedOn, household.locale) })}
        </p>
      ) : isPending ? (
        <Skeleton label={t('loading')} className="mt-2 h-11" />
      ) : (
        <ProblemState
          title={t('notLoaded')}
          className="mt-2"
          action={<Button onClick={() => void refetch()}>{common('tryAgain')}</Button>}
        >
          {problemWords(error)}
        </ProblemState>
      )}
      <div className="my-2.5">
        <ProfessionalCall />
      </div>
      <Disclosure summary={<span className="text-body">{t('writeDown')}</span>}>
        <VisitForm household={household} serverNow={serverNow} />
      </Disclosure>
      {data === undefined || data.length === 0 ? null : <VisitList visits={data} locale={household.locale} />}
      <PageLink href="/house" className={`${textLink} inline-flex min-h-11 items-center text-body`}>
        {t('houseSheet')}
      </PageLink>
    </section>
  );
}

function VisitList({ visits, locale }: { visits: NewestVisits; locale: string }) {
  const t = useTranslations('house.visits');
  return (
    <Disclosure summary={<span className="text-body">{t('newest', { count: visits.length })}</span>}>
      <ul>
        {visits.map(({ id, visitedOn, note, recordedBy }) => (
          <li key={id} className="border-t border-rule py-2 text-body first:border-t-0">
            <b>{dayWithYear(visitedOn, locale)}</b>
            {note === null ? null : <p className="break-words whitespace-pre-line">{note}</p>}
            {recordedBy === null ? null : <p className="text-small text-ink-2">{t('by', { name: recordedBy })}</p>}
          </li>
        ))}
      </ul>
    </Disclosure>
  );
}
