'use client';

import { RotateCcw } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { useForgetLearnt } from '@/lib/client/learnt';
import { useProblemWords } from '@/lib/messages/use-problem-words';

/** The way back to what was assumed, for when something of the pool has changed; asked once more before it is taken. */
export function StartAgain({ mayForget }: { mayForget: boolean }) {
  const t = useTranslations('learnt.forget');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const [asking, setAsking] = useState(false);
  const forget = useForgetLearnt();
  const ask = (open: boolean) => {
    if (open) forget.reset();
    setAsking(open);
  };
  return (
    <div className="grid items-center gap-x-6 gap-y-3 border-t border-ink py-3.5 sm:grid-cols-[minmax(0,1fr)_auto]">
      <p className="max-w-[66ch] text-body">
        <b className="font-strong">{t('ask')}</b> {t('then')}
      </p>
      {mayForget ? (
        <Button className="justify-self-start" onClick={() => ask(true)}>
          <RotateCcw aria-hidden="true" className="size-4.5" />
          {t('open')}
        </Button>
      ) : (
        <p className="text-small text-ink-2">{t('owners')}</p>
      )}
      <p role="status" className="text-body font-emphasis empty:hidden sm:col-span-2">
        {forget.isSuccess ? t('done') : null}
      </p>
      <Dialog
        open={asking}
        onOpenChange={ask}
        title={t('title')}
        description={t('description')}
        closeLabel={common('close')}
        actions={
          <>
            <Button
              variant="primary"
              busy={forget.isPending ? t('busy') : undefined}
              onClick={() => forget.mutate(undefined, { onSuccess: () => setAsking(false) })}
            >
              {t('yes')}
            </Button>
            <Button variant="quiet" onClick={() => ask(false)}>
              {t('no')}
            </Button>
          </>
        }
      >
        {forget.isError ? (
          <p role="alert" className="font-emphasis text-terra-ink">
            {t('notDone')} {problemWords(forget.error)}
          </p>
        ) : undefined}
      </Dialog>
    </div>
  );
}
