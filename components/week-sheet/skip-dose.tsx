'use client';

import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import type { Tick } from './use-tick';

/** Leaving a dose out is asked once more: the plan is made again without it. */
export function SkipDose({ tick, onClose }: { tick: Tick; onClose: () => void }) {
  const t = useTranslations('doses.action');
  return (
    <div role="group" aria-label={t('skip')} className="grid gap-2">
      <p className="font-emphasis">{t('skipAsk')}</p>
      <Button
        wide
        variant="primary"
        onClick={() => void tick.send({ action: 'skipped' })}
        busy={tick.busy === 'skipped' ? t('skipBusy') : undefined}
      >
        {t('skipConfirm')}
      </Button>
      <Button wide variant="quiet" onClick={onClose}>
        {t('keep')}
      </Button>
    </div>
  );
}
