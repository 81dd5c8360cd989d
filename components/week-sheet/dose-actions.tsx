'use client';

import { Eye } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useUnsentTicks } from '@/lib/client/unsent-ticks';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { bold } from './bold';
import { ClaimedBy } from './claimed-by';
import { momentOf, tickBar } from './dose-state';
import { DoneDose } from './done-dose';
import { DueActions } from './due-actions';
import { useSheet } from './sheet-context';
import { instantOf } from './sheet-times';
import { useTick } from './use-tick';
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
