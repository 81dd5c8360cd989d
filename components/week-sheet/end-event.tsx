'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { useEndPoolEvent } from '@/lib/client/pool-events';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { PoolEvent } from '@/lib/schemas/pool-event';

type Question = 'mistake' | 'replaced';

/** Ends what happened. It is asked once more: what did happen is over with a test, and a drain cover with a new one. */
export function EndEvent({ event: { id, kind } }: { event: PoolEvent }) {
  const t = useTranslations('events');
  const problemWords = useProblemWords();
  const end = useEndPoolEvent();
  const [asking, setAsking] = useState<Question | null>(null);
  return (
    <div className="grid gap-2">
      {asking ? (
        <div role="group" aria-label={t(`${asking}.button`)} className="grid gap-2">
          <p className="font-emphasis">{t(`${asking}.ask`)}</p>
          <div className="flex flex-wrap gap-2.5">
            <Button
              size="small"
              variant="primary"
              onClick={() => end.mutate(id)}
              busy={end.isPending ? t('ending') : undefined}
            >
              {t(`${asking}.yes`)}
            </Button>
            <Button size="small" variant="quiet" onClick={() => setAsking(null)}>
              {t('notYet')}
            </Button>
          </div>
        </div>
      ) : (
        <div className="flex flex-wrap gap-2.5">
          {kind === 'drain-cover' && (
            <Button size="small" variant="outline" onClick={() => setAsking('replaced')}>
              {t('replaced.button')}
            </Button>
          )}
          <Button size="small" variant="quiet" onClick={() => setAsking('mistake')}>
            {t('mistake.button')}
          </Button>
        </div>
      )}
      {end.error && (
        <p role="alert" className="font-emphasis text-terra-ink">
          {problemWords(end.error)}
        </p>
      )}
    </div>
  );
}
