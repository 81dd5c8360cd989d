'use client';

import { useTranslations } from 'next-intl';
import { useRef, useState } from 'react';
import { useLeftAlone } from '@/components/ui/use-left-alone';
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
import { useReadingSetting } from './reading-setting';
import { SavedTest } from './saved-test';
import type { TestDraft } from './test-draft-schema';
import { TestForm } from './test-form';
import { UnsentTests } from './unsent-tests';
import { useNow } from './use-now';
import { useTestDraft } from './use-test-draft';

export type AskedTest = {
  /** Which test the link asked for. */
  kind: TestDraft['kind'];
  /** The server's clock when the page was made [ms]. */
  serverNow: number;
};

type TestForNowProps = AskedTest & {
  /** What is kept of one that was begun on this device. */
  begun: TestDraft | undefined;
};

type Outcome = { sent: SentReading; before: readonly PlanDose[] | null };

/** A test from its first figure to what the sheet says of it. */
export function TestForNow({ kind, serverNow, begun }: TestForNowProps) {
  const t = useTranslations('readings');
  const problemWords = useProblemWords();
  const { householdId, personId } = useReadingSetting();
  const { now, read } = useNow(serverNow);
  // Nothing asks for it before the first figure is entered.
  const week = usePlannedWeek(useLeftAlone());
  const { draft, setDraft, forget, startAgain } = useTestDraft(kind, begun);
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
