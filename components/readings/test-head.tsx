'use client';

import { X } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { PageLink } from '@/components/navigation/page-link';
import { Button } from '@/components/ui/button';
import { Segments } from '@/components/ui/segments';
import { useReadingSetting } from './reading-setting';
import type { TestDraft } from './test-draft-schema';
import type { TestTime } from './test-time';
import { TimeFields } from './time-fields';
import { useTimeWords } from './use-time-words';

/** Which test it is, when it was taken and by whom. */
export function TestHead({
  draft,
  change,
  now,
  time,
}: {
  draft: TestDraft;
  change: (part: Partial<TestDraft>) => void;
  now: number;
  time: TestTime;
}) {
  const t = useTranslations('readings');
  const times = useTimeWords();
  const { personName } = useReadingSetting();
  const [changing, setChanging] = useState(draft.time !== null);
  return (
    <header className="px-margin">
      <div className="flex min-h-15.5 items-center gap-1 border-b-stop border-ink py-1.5 md:min-h-18">
        <PageLink href="/week" aria-label={t('close')} className="-ml-3 flex size-12 items-center justify-center">
          <X aria-hidden="true" className="size-5.5" />
        </PageLink>
        <div className="min-w-0 flex-1">
          <h1 className="font-display text-[20px] leading-6 font-section md:text-headline md:leading-10.5">
            {t(`kind.${draft.kind}`)}
          </h1>
          <p className="text-small text-ink-2">
            {t('takenBy', { when: times.dayAndTime(time.takenAt ?? now), name: personName })}
          </p>
        </div>
        <Button variant="quiet" aria-expanded={changing} onClick={() => setChanging(!changing)}>
          {t('time.change')}
        </Button>
      </div>
      <div className="pt-3">
        {changing ? (
          <TimeFields
            time={draft.time}
            now={now}
            problem={time.problem}
            onChange={(next) => {
              change({ time: next });
              if (next === null) setChanging(false);
            }}
          />
        ) : null}
        <Segments
          size="small"
          hideLabel
          label={t('kind.label')}
          choices={(['full', 'quick'] as const).map((kind) => ({
            value: kind,
            label: t(`kind.${kind}`),
          }))}
          value={draft.kind}
          onChange={(kind) => change({ kind })}
          className="md:max-w-form"
        />
      </div>
    </header>
  );
}
