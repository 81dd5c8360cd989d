'use client';

import { useTranslations } from 'next-intl';
import Link from 'next/link';
import { useRef, useState } from 'react';
import { buttonClass } from '@/components/ui/button-class';
import { Skeleton } from '@/components/ui/skeleton';
import { useHydrated } from '@/components/ui/use-hydrated';
import { RequestProblem } from '@/lib/client/fetch-json';
import {
  type PlannedWeek,
  type SentReading,
  useCorrectReading,
  usePlannedWeek,
  useSendReading,
} from '@/lib/client/readings';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import type { NewReading } from '@/lib/schemas/reading';
import { KeptOnDevice } from './kept-on-device';
import { OpenZero } from './open-zero';
import { type ReadingHousehold, ReadingSettingProvider, useReadingSetting } from './reading-setting';
import { SavedTest } from './saved-test';
import type { TestDraft } from './test-draft';
import { TestForm } from './test-form';
import { UnsentTests } from './unsent-tests';
import { useNow } from './use-now';
import { useTestDraft } from './use-test-draft';

export type TestEntryProps = {
  household: ReadingHousehold;
  /** Which test the link asked for. */
  kind: TestDraft['kind'];
  /** The server's clock when the page was made [ms]. */
  serverNow: number;
};

/** Enter a test. */
export function TestEntry({ household, kind, serverNow }: TestEntryProps) {
  const common = useTranslations('common');
  // Drafts live on the device, which the server does not know.
  const hydrated = useHydrated();
  if (household.role === 'viewer') return <OnlyLooking />;
  if (!hydrated) return <Skeleton label={common('loading')} className="m-margin h-96" />;
  return (
    <ReadingSettingProvider household={household}>
      <Entry kind={kind} serverNow={serverNow} />
    </ReadingSettingProvider>
  );
}

type Outcome = { sent: SentReading; before: readonly PlanDose[] | null };

function Entry({ kind, serverNow }: Omit<TestEntryProps, 'household'>) {
  const t = useTranslations('readings');
  const problemWords = useProblemWords();
  const { householdId, personId } = useReadingSetting();
  const { now, read } = useNow(serverNow);
  const week = usePlannedWeek();
  const { draft, setDraft, forget, startAgain } = useTestDraft(kind);
  const send = useSendReading({ personId, householdId });
  const correct = useCorrectReading();
  const [outcome, setOutcome] = useState<Outcome | null>(null);
  // A second press comes before React has drawn the first: the button alone would be too late.
  const sending = useRef(false);

  const save = (reading: NewReading) => {
    if (sending.current) return;
    sending.current = true;
    const before = planBefore(week);
    const mutation = draft.correcting ? correct : send;
    mutation.mutate(reading, {
      onSuccess: (sent) => {
        setOutcome({ sent, before });
        // What was typed stays until it is answered, and is forgotten only then.
        forget();
      },
      onSettled: () => {
        sending.current = false;
      },
    });
  };
  const again = () => {
    setOutcome(null);
    send.reset();
    correct.reset();
    startAgain();
  };

  if (outcome?.sent.where === 'device') return <KeptOnDevice onAgain={again} />;
  if (outcome?.sent.where === 'server') {
    const { reading, week: after } = outcome.sent;
    return (
      <SavedTest
        reading={reading}
        week={after}
        before={outcome.before}
        onCorrect={() => {
          setOutcome(null);
          setDraft({ ...draft, correcting: true });
        }}
      >
        <OpenZero sheet={after?.sheet} onAnswered={(sent) => setOutcome({ sent, before: outcome.before })} />
      </SavedTest>
    );
  }
  const error = send.error ?? correct.error;
  return (
    <>
      <div className="mx-margin mt-3 empty:hidden">
        <UnsentTests />
        <OpenZero sheet={week?.sheet} onAnswered={(sent) => setOutcome({ sent, before: planBefore(week) })} />
      </div>
      <TestForm
        draft={draft}
        change={(part) => setDraft({ ...draft, ...part })}
        now={now}
        readNow={read}
        week={week}
        onSave={save}
        busy={send.isPending || correct.isPending}
        problem={
          error === null
            ? undefined
            : {
                title: t('notSaved'),
                lines: [
                  problemWords(error),
                  ...(error instanceof RequestProblem ? error.problems.map(({ message }) => message) : []),
                ],
              }
        }
      />
    </>
  );
}

function planBefore(week: PlannedWeek | undefined): readonly PlanDose[] | null {
  return week === undefined || week.sheet.plan === null ? null : week.doses;
}

function OnlyLooking() {
  const t = useTranslations('readings.viewer');
  return (
    <div className="mx-auto max-w-reading px-margin py-8">
      <h1 className="font-display-soft text-board">{t('title')}</h1>
      <p className="mt-2 text-body text-ink-2">{t('words')}</p>
      <Link href="/week" className={buttonClass({ variant: 'primary', className: 'mt-4' })}>
        {t('seeWeek')}
      </Link>
    </div>
  );
}
