'use client';

import { useInfiniteQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { bold } from '@/components/week-sheet/bold';
import { dayRange, timeOfDay } from '@/lib/calendar/format';
import { auditTrailOptions } from '@/lib/client/audit-trail';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { AuditActor, AuditEntryShown } from '@/lib/schemas/audit-entry';
import { dayIn } from './day-in';
import type { HouseholdSetting } from './household-setting';

/** Who changed what, for owners; fetched when it is asked for. */
export function AuditTrail({ setting }: { setting: HouseholdSetting }) {
  const t = useTranslations('household.audit');
  const [open, setOpen] = useState(false);
  return (
    <section aria-labelledby="audit-trail" className="mt-5 border-t border-ink pt-2.5">
      <h2 id="audit-trail" className="font-display text-section">
        {t('title')}
      </h2>
      <p className="mb-2.5 text-small text-ink-2">{t('lead')}</p>
      {open ? <Entries setting={setting} /> : <Button onClick={() => setOpen(true)}>{t('show')}</Button>}
    </section>
  );
}

function Entries({ setting }: { setting: HouseholdSetting }) {
  const t = useTranslations('household.audit');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const { data, isPending, error, refetch, ...more } = useInfiniteQuery(auditTrailOptions());
  if (isPending) return <Skeleton label={t('loading')} className="h-40" />;
  if (data === undefined)
    return (
      <ProblemState
        title={t('notLoaded')}
        action={<Button onClick={() => void refetch()}>{common('tryAgain')}</Button>}
      >
        {problemWords(error)}
      </ProblemState>
    );
  const entries = data.pages.flatMap((page) => page.entries);
  return (
    <>
      {entries.length === 0 ? <p className="text-body">{t('nothing')}</p> : null}
      <ol>
        {entries.map((entry) => (
          <Entry key={entry.id} entry={entry} setting={setting} />
        ))}
      </ol>
      {more.hasNextPage ? (
        <Button
          className="mt-3"
          busy={more.isFetchingNextPage ? t('fetching') : undefined}
          onClick={() => void more.fetchNextPage()}
        >
          {t('earlier')}
        </Button>
      ) : null}
      {error === null ? null : (
        <p role="alert" className="mt-1.5 text-small font-emphasis text-terra-ink">
          {problemWords(error)}
        </p>
      )}
    </>
  );
}

function Entry({ entry, setting }: { entry: AuditEntryShown; setting: HouseholdSetting }) {
  const t = useTranslations('household.audit');
  const role = useTranslations('household.role');
  const nameOf = useActorName();
  const { locale, timeZone } = setting;
  const day = dayIn(setting, entry.at);
  const time = timeOfDay(Date.parse(entry.at), timeZone, locale);
  const what = t(`actions.${entry.action}`, {
    member: entry.member === null ? t('former') : nameOf(entry.member),
    named: entry.named ?? '',
    isNamed: entry.named === null ? 'no' : 'yes',
    role: entry.role === null ? '' : role(entry.role),
    chemicals: entry.chemicalsAllowed ? 'yes' : 'no',
    days: entry.days === null ? '' : dayRange(entry.days.from, entry.days.until, locale, t('joiner')),
  });
  return (
    <li className="grid gap-x-4 border-t border-rule py-2 md:grid-cols-[13rem_minmax(0,1fr)]">
      <time dateTime={entry.at} className="text-small text-ink-2">
        {t('moment', { day, time })}
      </time>
      <span className="min-w-0 text-body break-words">
        {t.rich('entry', { who: nameOf(entry.who), what, b: bold })}
      </span>
    </li>
  );
}

function useActorName(): (actor: AuditActor) => string {
  const t = useTranslations('household.audit');
  const common = useTranslations('common');
  return (actor) =>
    actor.kind === 'person' ? actor.name : actor.kind === 'server' ? common('productName') : t('former');
}
