'use client';

import { Hand } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { TickBox } from '@/components/ui/tick-box';
import { useUnsentTicks } from '@/lib/client/unsent-ticks';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { DoneLine } from './done-line';
import { DoseDialog } from './dose-dialog';
import { mayAddFound, mayUndo, momentOf, tickBar } from './dose-state';
import { Doubtful } from './doubtful';
import { MarkedMeasure } from './marked-measure';
import { useSheet } from './sheet-context';
import { useAsksStop } from './use-asks-stop';
import { useDosingBar } from './use-dosing-bar';
import { useDoseWords } from './use-dose-words';
import { useTick } from './use-tick';
import { useTickProblem } from './use-tick-problem';

/** A dose in its column: what, how much, when; once it is due, the box to tick. Its dialog stays open over a tick. */
export function ToDoDose({ dose }: { dose: PlanDose }) {
  const { picture } = useSheet();
  const [open, setOpen] = useState(false);
  const moment = momentOf(dose, picture.now);
  const Line = moment === 'done' || moment === 'skipped' ? DoneToDo : OpenToDo;
  return (
    <div className="flex flex-col last:flex-1">
      <Line dose={dose} onOpen={() => setOpen(true)} />
      <DoseDialog dose={dose} open={open} onOpenChange={setOpen} />
    </div>
  );
}

type LineProps = { dose: PlanDose; onOpen: () => void };

function DoneToDo({ dose, onOpen }: LineProps) {
  const t = useTranslations('doses');
  const { sheet, picture } = useSheet();
  const words = useDoseWords();
  const skipped = dose.status === 'skipped';
  return (
    <>
      <DoneLine
        what={words.amountAndProduct(dose)}
        who={skipped ? words.skippedBy(dose) : words.doneBy(dose)}
        skipped={skipped}
      />
      <Doubtful dose={dose} small />
      {mayAddFound(dose, picture.now, sheet.me) && <StepsLink onPress={onOpen}>{t('tabletsLeft.ask')}</StepsLink>}
      {mayUndo(dose, picture.now, sheet.me) && <StepsLink onPress={onOpen}>{t('action.undo')}</StepsLink>}
    </>
  );
}

function OpenToDo({ dose, onOpen }: LineProps) {
  const t = useTranslations('doses');
  const { sheet, picture } = useSheet();
  const words = useDoseWords();
  const moment = momentOf(dose, picture.now);
  const barred = useDosingBar();
  const asksStop = useAsksStop()(dose);
  const ticks = moment !== 'ahead' && tickBar(sheet.me) === undefined;
  return (
    <>
      {dose.claimedBy !== null && (
        <p className="mb-1 flex items-center gap-1 text-chart font-strong">
          <Hand aria-hidden="true" className="size-4" />
          {dose.claimedBy === sheet.me.name ? t('claimed.self') : t('claimed.other', { name: dose.claimedBy })}
        </p>
      )}
      <p className="mb-0.5 text-fine text-ink-2">{words.hourOf(dose, { pump: false })}</p>
      <p className="font-display text-[25px] leading-[27px] font-headline tracking-dose">{words.amountOf(dose)}</p>
      <p className="text-[13.5px] leading-[17px] font-strong">{words.productOf(dose)}</p>
      <MarkedMeasure dose={dose} small />
      {barred === undefined ? (
        <p className="mt-1.25 text-fine text-ink-2">
          {dose.pumpUntil !== null && <>{words.pump(dose)} </>}
          {words.afterwards(dose)}
        </p>
      ) : (
        <p className="mt-1.25 border-l-care border-ochre-ink pl-1.5 text-fine font-emphasis">{barred}</p>
      )}
      <div className="mt-auto pt-1">
        {ticks && barred === undefined && !asksStop && <TickHere dose={dose} />}
        <StepsLink onPress={onOpen}>
          {t(asksStop ? 'stop.first' : ticks ? 'action.stepsAndMore' : 'action.steps')}
        </StepsLink>
      </div>
    </>
  );
}

/** One tap marks the dose as added; the way back stays open for ten minutes. */
function TickHere({ dose }: { dose: PlanDose }) {
  const t = useTranslations('doses');
  const { sheet } = useSheet();
  const { send, busy, problem } = useTick(dose);
  const problemWords = useTickProblem();
  const waiting = useUnsentTicks(sheet.me.id).some(({ doseId }) => doseId === dose.id);
  if (waiting) return <p className="text-fine font-emphasis">{t('unsent.card')}</p>;
  return (
    <>
      {dose.claimedBy === null && (
        <StepsLink onPress={() => void send({ action: 'claim' })}>
          {t(busy === 'claim' ? 'action.claimBusy' : 'action.claim')}
        </StepsLink>
      )}
      <TickBox
        label={
          <span className="text-small font-emphasis">{t(busy === 'given' ? 'action.givenBusy' : 'action.given')}</span>
        }
        checked={busy === 'given'}
        onChange={() => void send({ action: 'given' })}
        {...(problem === undefined ? {} : { problem: problemWords(problem) })}
      />
    </>
  );
}

function StepsLink({ onPress, children }: { onPress: () => void; children: React.ReactNode }) {
  return (
    <button
      type="button"
      onClick={onPress}
      className="inline-flex min-h-6 cursor-pointer items-center text-left text-small font-emphasis underline decoration-1 underline-offset-3 pointer-coarse:min-h-11"
    >
      {children}
    </button>
  );
}
