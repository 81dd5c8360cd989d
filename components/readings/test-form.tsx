'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { Segments } from '@/components/ui/segments';
import { useIsPhone } from '@/components/week-sheet/use-is-phone';
import { useKept } from '@/lib/client/device-store';
import type { PlannedWeek } from '@/lib/client/readings';
import type { NewReading } from '@/lib/schemas/reading';
import { waterLooks } from '@/lib/schemas/reading-kinds';
import { firstBottle, keptBottle } from './bottle';
import { doubtsOf } from './doubts';
import { asked, enteredOf } from './entered';
import { FalseZero } from './false-zero';
import { KitPad } from './kit-pad';
import { MethodChoice } from './method-choice';
import { newReadingOf } from './new-reading';
import { quickQuantities, type EntryQuantity } from './quantities';
import { useReadingSetting } from './reading-setting';
import { StripEntry } from './strip-entry';
import { StripTimer } from './strip-timer';
import type { TestDraft } from './test-draft-schema';
import { TestHead } from './test-head';
import { TestNote } from './test-note';
import { testTime } from './test-time';
import { ValueFields } from './value-fields';
import { zeroAnswerTo, zeroQuestionOf, zeroSubject } from './zero-question';

export type TestFormProps = {
  draft: TestDraft;
  change: (part: Partial<TestDraft>) => void;
  /** Now, and a way to read it again at the moment of saving [ms]. */
  now: number;
  readNow: () => number;
  week: PlannedWeek | undefined;
  onSave: (reading: NewReading) => void;
  busy: boolean;
  problem: { title: string; lines: readonly string[] } | undefined;
};

/** A test as it is written down: full or quick; by strip, drop kit or shop slip. */
export function TestForm({ draft, change, now, readNow, week, onSave, busy, problem }: TestFormProps) {
  const t = useTranslations('readings');
  const { householdId, timeZone } = useReadingSetting();
  const [bottle, setBottle] = useKept(`wadewell.bottle.${householdId}`, keptBottle, () => firstBottle);
  const [typing, setTyping] = useState<EntryQuantity | null>(null);

  const quantities = asked(draft, bottle);
  const entered = enteredOf(draft, bottle);
  const doubts = doubtsOf(draft, entered, bottle, typing);
  const time = testTime(draft.time, now, timeZone);
  // Nobody is asked about the 0 of "0.8" while it is being typed.
  const zero =
    typing === 'freeChlorine' ? undefined : zeroQuestionOf(entered.freeChlorine, time.takenAt ?? now, week?.sheet);
  const zeroAnswer = zeroAnswerTo(draft, entered.freeChlorine);
  const open = doubts.length + (zero && zeroAnswer === null ? 1 : 0) + (time.problem ? 1 : 0);
  const pads = quantities.filter((quantity) => quantity !== 'temperature');
  const read = pads.filter((quantity) => entered[quantity] !== undefined).length;
  const complete = quickQuantities.every((quantity) => entered[quantity] !== undefined);
  const offReason = () => {
    if (open > 0) return t('save.open', { count: open });
    if (Object.keys(entered).length === 0) return t('save.empty');
    return draft.kind === 'full' && !complete ? t('save.needsBoth') : undefined;
  };

  const save = () => {
    const { takenAt } = testTime(draft.time, readNow(), timeZone);
    if (takenAt === undefined) return;
    const answer = zero ? zeroAnswer : null;
    onSave(newReadingOf({ draft, entered, takenAt, timeZone, zeroAnswer: answer === 'later' ? null : answer }));
  };

  // On a phone a kit is typed with keys of our own; they take the place of the bar below while a field is open.
  const ownKeys = useIsPhone() === true && draft.method === 'drop-kit';
  const fields = (names: readonly EntryQuantity[]) => ({
    quantities: names,
    draft,
    change,
    doubts,
    onTyping: setTyping,
  });

  return (
    <form
      noValidate
      className="flex min-h-[calc(100dvh-9rem)] flex-col md:min-h-0"
      onSubmit={(event) => {
        event.preventDefault();
        // The field in which somebody was typing is judged now; the form is sent when nothing is open any more.
        if (typing !== null) setTyping(null);
        else if (offReason() === undefined && !busy) save();
      }}
    >
      <TestHead draft={draft} change={change} now={now} time={time} />
      <div className="grid flex-1 content-start gap-x-10 px-margin pt-3 pb-5 lg:grid-cols-[minmax(0,600px)_minmax(0,420px)]">
        <div className="min-w-0">
          <MethodChoice value={draft.method} onChange={(method) => change({ method })} />
          <TestNote kind={draft.kind} />
          {draft.method === 'strip' ? (
            <>
              <div className="mb-3.5">
                <StripTimer />
              </div>
              <StripEntry draft={draft} change={change} entered={entered} bottle={bottle} onBottle={setBottle} />
              {doubts.some(({ kind }) => kind === 'total-below-free') ? (
                <p role="alert" className="mt-2 border-l-care border-ochre-ink bg-care-wash p-3 text-body">
                  {t('doubt.totalBelowFree')}
                </p>
              ) : null}
            </>
          ) : (
            <>
              {draft.method === 'drop-kit' ? (
                <p className="pb-2.5 text-small text-ink-2">{t(ownKeys ? 'kit.phoneNote' : 'kit.note')}</p>
              ) : null}
              <ValueFields {...fields(quantities)} ownKeys={ownKeys} />
            </>
          )}
          {zero === undefined ? null : (
            <FalseZero
              expected={zero.expected}
              answer={zeroAnswer}
              onAnswer={(answer) => change({ zeroAnswer: answer, zeroFor: zeroSubject(entered.freeChlorine) })}
            />
          )}
        </div>
        <div className="mt-4 min-w-0 border-t border-rule pt-3 lg:mt-0 lg:border-t-0 lg:border-l lg:pt-0 lg:pl-6.5">
          <Segments
            label={t('look.label')}
            choices={waterLooks.map((look) => ({ value: look, label: t(`look.${look}`) }))}
            value={draft.look}
            onChange={(look) => change({ look })}
            hint={draft.look === 'clear' ? t('look.clearNote') : t('look.notClearNote')}
          />
          {draft.method === 'strip' && draft.kind === 'full' ? (
            <div className="mt-4 border-t border-rule pt-3">
              <ValueFields {...fields(['temperature'])} />
            </div>
          ) : null}
          {problem === undefined ? null : (
            <ProblemState className="mt-4" title={problem.title}>
              {problem.lines.map((line) => (
                <p key={line}>{line}</p>
              ))}
            </ProblemState>
          )}
        </div>
      </div>
      {ownKeys && typing !== null ? (
        <div className="sticky bottom-tabs z-10 border-t border-ink bg-paper px-margin pt-2 pb-2.5">
          <KitPad current={typing} quantities={quantities} draft={draft} change={change} />
        </div>
      ) : (
        <SaveBar
          left={
            draft.method === 'strip'
              ? t('save.pads', { read, all: pads.length })
              : t('save.values', { read, all: pads.length })
          }
          label={t(draft.correcting ? 'save.correct' : draft.kind === 'quick' ? 'save.quick' : 'save.full')}
          busy={busy ? t('save.busy') : undefined}
          offReason={offReason()}
        />
      )}
    </form>
  );
}

function SaveBar({
  left,
  label,
  busy,
  offReason,
}: {
  left: string;
  label: string;
  busy: string | undefined;
  offReason: string | undefined;
}) {
  const t = useTranslations('readings.save');
  return (
    <div className="sticky bottom-tabs z-10 border-t border-ink bg-paper-lift px-margin pt-2.5 pb-3 md:bottom-0 md:mx-margin md:flex md:items-center md:gap-4.5 md:bg-paper md:px-0">
      <p className="mb-2 flex flex-1 justify-between gap-3 text-small text-ink-2 md:mb-0">
        <span>{left}</span>
        <span id="save-reason" className="text-right">
          {offReason ?? t('untouched')}
        </span>
      </p>
      <Button
        type="submit"
        variant="primary"
        size="large"
        className="w-full md:min-h-11 md:w-auto"
        busy={busy}
        {...(offReason === undefined ? {} : { offReasonId: 'save-reason' })}
      >
        {label}
      </Button>
    </div>
  );
}
