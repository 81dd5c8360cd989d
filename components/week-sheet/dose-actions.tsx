'use client';

import { Check, Eye, Hand, UserRound } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { useUnsentTicks } from '@/lib/client/unsent-ticks';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { bold } from './bold';
import { momentOf, tickBar } from './dose-state';
import { DoneDose } from './done-dose';
import { OtherAmount } from './other-amount';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { SkipDose } from './skip-dose';
import { TabletsLeft } from './tablets-left';
import { useDosingBar } from './use-dosing-bar';
import { type Tick, useTick } from './use-tick';
import { useTimes } from './use-times';
import { useTickProblem } from './use-tick-problem';

/** What this person may do about a dose at this moment, or why they may not. */
export function DoseActions({ dose }: { dose: PlanDose }) {
  const t = useTranslations('doses');
  const { sheet, picture } = useSheet();
  const problemWords = useTickProblem();
  const tick = useTick(dose);
  const waiting = useUnsentTicks(sheet.me.id).some(({ doseId }) => doseId === dose.id);
  const moment = momentOf(dose, picture.now);
  const bar = tickBar(sheet.me);

  if (waiting) return <p className="text-body font-emphasis">{t('unsent.card')}</p>;
  return (
    <div className="grid gap-2">
      {moment === 'done' || moment === 'skipped' ? (
        <DoneDose dose={dose} tick={tick} />
      ) : bar !== undefined ? (
        <Barred words={t(`bar.${bar}`)} claimedBy={moment === 'claimed' ? dose.claimedBy : null} />
      ) : moment === 'ahead' ? (
        <NotYet dose={dose} />
      ) : (
        <DueActions dose={dose} tick={tick} />
      )}
      {tick.problem !== undefined && (
        <p role="alert" className="text-small font-emphasis text-terra-ink">
          {problemWords(tick.problem)}
        </p>
      )}
    </div>
  );
}

function DueActions({ dose, tick }: { dose: PlanDose; tick: Tick }) {
  const t = useTranslations('doses');
  const { sheet } = useSheet();
  const [asking, setAsking] = useState<'other' | 'skip' | undefined>(undefined);
  const [left, setLeft] = useState<number | undefined>(undefined);
  // What went in all the same can be ticked; nobody is asked to begin.
  const barred = useDosingBar() !== undefined;
  const found = left === undefined ? {} : { tabletsLeft: left };
  if (asking === 'other')
    return <OtherAmount dose={dose} tick={tick} found={found} onClose={() => setAsking(undefined)} />;
  if (asking === 'skip') return <SkipDose tick={tick} onClose={() => setAsking(undefined)} />;
  return (
    <>
      {dose.claimedBy !== null ? (
        <ClaimedBy name={dose.claimedBy} />
      ) : barred ? null : (
        <Button
          wide
          size="large"
          onClick={() => void tick.send({ action: 'claim' })}
          busy={tick.busy === 'claim' ? t('action.claimBusy') : undefined}
        >
          <Hand aria-hidden="true" className="size-5" />
          {t('action.claim')}
        </Button>
      )}
      {dose.claimedBy === sheet.me.name && (
        <Button
          wide
          onClick={() => void tick.send({ action: 'undo' })}
          busy={tick.busy === 'undo' ? t('action.undoBusy') : undefined}
        >
          {t('action.unclaim')}
        </Button>
      )}
      {dose.form === 'tablet' && <TabletsLeft value={left} onChange={setLeft} />}
      <Button
        wide
        size="large"
        variant="primary"
        onClick={() => void tick.send({ action: 'given', ...found })}
        busy={tick.busy === 'given' ? t('action.givenBusy') : undefined}
      >
        <Check aria-hidden="true" className="size-5" />
        {t('action.given')}
      </Button>
      <div className="flex flex-wrap justify-between gap-x-4">
        <Button variant="quiet" onClick={() => setAsking('other')}>
          {t('action.other')}
        </Button>
        <Button variant="quiet" onClick={() => setAsking('skip')}>
          {t('action.skip')}
        </Button>
      </div>
      <p className="flex gap-2 text-small text-ink-2">
        <UserRound aria-hidden="true" className="size-4.5 shrink-0" />
        {t('may', { name: sheet.me.name })}
      </p>
    </>
  );
}

function ClaimedBy({ name }: { name: string }) {
  const t = useTranslations('doses.claimed');
  const { sheet } = useSheet();
  return (
    <p className="flex items-center gap-2 font-strong">
      <Hand aria-hidden="true" className="size-5" />
      {name === sheet.me.name ? t('self') : t('other', { name })}
    </p>
  );
}

function Barred({ words, claimedBy }: { words: string; claimedBy: string | null }) {
  return (
    <>
      {claimedBy !== null && <ClaimedBy name={claimedBy} />}
      <p className="flex gap-2 text-small text-ink-2">
        <Eye aria-hidden="true" className="size-4.5 shrink-0" />
        {words}
      </p>
    </>
  );
}

function NotYet({ dose }: { dose: PlanDose }) {
  const t = useTranslations('doses');
  const times = useTimes();
  const from = instantOf(dose.tickFrom);
  return (
    <p className="text-small text-ink-2">
      {t.rich('from3h', {
        when: t('fromWhen', { day: times.dayInWords(from), time: times.clock(from) }),
        claim: t('action.claim'),
        given: t('action.given'),
        b: bold,
      })}
    </p>
  );
}
