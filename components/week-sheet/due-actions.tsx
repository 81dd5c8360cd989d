'use client';

import { Check, Hand, UserRound } from 'lucide-react';
import dynamic from 'next/dynamic';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { untilFetched } from '@/components/ui/until-fetched';
import { useIdleFetch } from '@/components/ui/use-idle-fetch';
import type { PlanDose } from '@/lib/schemas/plan-dose';
import { ClaimedBy } from './claimed-by';
import { ConfirmStop } from './confirm-stop';
import { useSheet } from './sheet-context';
import { SkipDose } from './skip-dose';
import { TabletsLeft } from './tablets-left';
import { useAsksStop } from './use-asks-stop';
import { useDosingBar } from './use-dosing-bar';
import type { Tick } from './use-tick';

const fetchOtherAmount = () => import('./other-amount');
const OtherAmount = dynamic(() => untilFetched(() => import('./other-amount')).then((part) => part.OtherAmount), {
  ssr: false,
});

/** What may be said of a dose that is due. Where the Stop is still to be read, that comes before all that puts it in. */
export function DueActions({ dose, tick }: { dose: PlanDose; tick: Tick }) {
  const t = useTranslations('doses');
  const { sheet } = useSheet();
  const [asking, setAsking] = useState<'other' | 'skip' | undefined>(undefined);
  const [left, setLeft] = useState<number | undefined>(undefined);
  useIdleFetch(fetchOtherAmount);
  const asksStop = useAsksStop()(dose);
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
      ) : barred || asksStop ? null : (
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
      {asksStop ? (
        <ConfirmStop key={dose.id} dose={dose} />
      ) : (
        <>
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
        </>
      )}
      <div className="flex flex-wrap justify-between gap-x-4">
        {!asksStop && (
          <Button variant="quiet" onClick={() => setAsking('other')}>
            {t('action.other')}
          </Button>
        )}
        <Button variant="quiet" onClick={() => setAsking('skip')}>
          {t('action.skip')}
        </Button>
      </div>
      {!asksStop && (
        <p className="flex gap-2 text-small text-ink-2">
          <UserRound aria-hidden="true" className="size-4.5 shrink-0" />
          {t('may', { name: sheet.me.name })}
        </p>
      )}
    </>
  );
}
