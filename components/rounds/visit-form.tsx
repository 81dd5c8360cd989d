'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { type FieldProblems, noProblems } from '@/components/pool/field-problems';
import { Button } from '@/components/ui/button';
import { TextField } from '@/components/ui/text-field';
import { useIdleFetch } from '@/components/ui/use-idle-fetch';
import { dayOf } from '@/lib/calendar/household-day';
import { RequestProblem } from '@/lib/client/fetch-json';
import { useRecordVisit } from '@/lib/client/visits';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { RoundHousehold } from './round-household';

/** What is typed is checked when it is kept: what does that comes after the page. */
const fetchCheck = () => import('./check-visit');

type Props = { household: RoundHousehold; serverNow: number };

/** A day and what was done. What was typed stays until it is kept. */
export function VisitForm({ household: { timeZone, mayKeepHouseNotes }, serverNow }: Props) {
  const t = useTranslations('house.visits');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const record = useRecordVisit();
  const today = dayOf(serverNow, timeZone);
  const blank = () => ({ id: crypto.randomUUID(), visitedOn: today, note: '' });
  // The id goes with what is typed, so that sending it again is the same visit.
  const [draft, setDraft] = useState(blank);
  const [problems, setProblems] = useState<FieldProblems>(noProblems);
  const change = (part: Partial<typeof draft>) => {
    setDraft({ ...draft, ...part });
    record.reset();
  };
  const refused = record.error instanceof RequestProblem ? record.error : undefined;
  useIdleFetch(fetchCheck);
  const send = async () => {
    if (record.isPending) return;
    const { note, ...rest } = draft;
    const visit = note.trim() === '' ? rest : draft;
    // Where it cannot be fetched nothing can be sent either, and that is then what is said.
    const checked = await fetchCheck().then(
      ({ checkVisit }) => checkVisit(visit),
      () => ({ answers: visit, problems: noProblems }),
    );
    setProblems(checked.problems);
    if (checked.answers) record.mutate(checked.answers, { onSuccess: () => setDraft(blank()) });
  };
  return (
    <form
      noValidate
      className="grid gap-3"
      onSubmit={(event) => {
        event.preventDefault();
        void send();
      }}
    >
      <TextField
        type="date"
        name="visitedOn"
        label={t('day')}
        max={today}
        readOnly={!mayKeepHouseNotes}
        value={draft.visitedOn}
        problem={problems.visitedOn ?? refused?.at('visitedOn')}
        onChange={(event) => change({ visitedOn: event.target.value })}
      />
      <TextField
        name="note"
        label={t('note')}
        aside={common('optional')}
        autoComplete="off"
        readOnly={!mayKeepHouseNotes}
        value={draft.note}
        problem={problems.note ?? refused?.at('note')}
        onChange={(event) => change({ note: event.target.value })}
      />
      <Button
        type="submit"
        busy={record.isPending ? t('saving') : undefined}
        offReason={mayKeepHouseNotes ? undefined : t('mayNot')}
      >
        {t('save')}
      </Button>
      <p role="status" className="text-small text-ink-2 empty:hidden">
        {record.isSuccess ? t('kept') : null}
      </p>
      {record.error === null ? null : (
        <p role="alert" className="text-small font-emphasis text-terra-ink">
          {problemWords(record.error)}
        </p>
      )}
    </form>
  );
}
