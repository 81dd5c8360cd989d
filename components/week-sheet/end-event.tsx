'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { useEndPoolEvent } from '@/lib/client/pool-events';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { PoolEvent } from '@/lib/schemas/pool-event';

/** Ends what happened: a mistake is taken back at once, a new drain cover is asked about first. */
export function EndEvent({ event: { id, kind } }: { event: PoolEvent }) {
  const t = useTranslations('events');
  const problemWords = useProblemWords();
  const end = useEndPoolEvent();
  const [asking, setAsking] = useState(false);
  const drain = kind === 'drain-cover';
  const busy = end.isPending ? t(drain ? 'replacing' : 'takingBack') : undefined;
  return (
    <div className="grid gap-2">
      {asking ? (
        <div role="group" aria-label={t('replaced')} className="grid gap-2">
          <p className="font-emphasis">{t('replacedAsk')}</p>
          <div className="flex flex-wrap gap-2.5">
            <Button size="small" variant="primary" onClick={() => end.mutate(id)} busy={busy}>
              {t('replacedYes')}
            </Button>
            <Button size="small" variant="quiet" onClick={() => setAsking(false)}>
              {t('notYet')}
            </Button>
          </div>
        </div>
      ) : (
        <Button
          size="small"
          variant="outline"
          className="justify-self-start"
          onClick={() => (drain ? setAsking(true) : end.mutate(id))}
          busy={busy}
        >
          {t(drain ? 'replaced' : 'takeBack')}
        </Button>
      )}
      {end.error && (
        <p role="alert" className="font-emphasis text-terra-ink">
          {problemWords(end.error)}
        </p>
      )}
    </div>
  );
}
