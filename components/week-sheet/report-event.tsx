'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { RadioRows } from '@/components/ui/radio-rows';
import { useReportPoolEvent } from '@/lib/client/pool-events';
import { useClock } from './clock-context';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { type PoolEventKind, poolEventKinds } from '@/lib/schemas/pool-event';

/** What happened, in one choice; the advice for it stands there before anything is sent. */
export function ReportEvent({ onClose }: { onClose: () => void }) {
  const t = useTranslations('events');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const report = useReportPoolEvent();
  const clock = useClock();
  const [kind, setKind] = useState<PoolEventKind | null>(null);
  const [missing, setMissing] = useState(false);
  // One id for as long as the question is open: sent twice, it is written down once.
  const [id] = useState(() => crypto.randomUUID());
  const send = () => {
    if (kind === null) return setMissing(true);
    report.mutate({ id, kind, happenedAt: new Date(clock()).toISOString() }, { onSuccess: onClose });
  };
  return (
    <Dialog
      open
      onOpenChange={(open) => !open && onClose()}
      title={t('title')}
      description={t('description')}
      closeLabel={common('close')}
      actions={
        <>
          <Button variant="primary" onClick={send} busy={report.isPending ? t('reporting') : undefined}>
            {t('report')}
          </Button>
          <Button variant="quiet" onClick={onClose}>
            {kind === null ? t('cancel') : common('close')}
          </Button>
        </>
      }
    >
      <RadioRows
        label={t('title')}
        hideLabel
        problem={missing && kind === null ? t('choose') : undefined}
        choices={poolEventKinds.map((value) => ({
          value,
          label: t(`kind.${value}.name`),
          detail: t(`kind.${value}.detail`),
        }))}
        value={kind}
        onChange={setKind}
      />
      <p role="status" className="mt-3 font-emphasis text-pretty">
        {kind === null ? null : t(`kind.${kind}.advice`)}
      </p>
      {report.error && (
        <p role="alert" className="mt-2 text-small font-emphasis text-terra-ink">
          {problemWords(report.error)}
        </p>
      )}
    </Dialog>
  );
}
