'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { closeTour } from '@/lib/client/tour';

const notes = ['verdict', 'curve', 'doses', 'help'] as const;

/** Four short notes beside the first sheet of a person. Closed once, they never come back. */
export function Tour() {
  const t = useTranslations('tour');
  const [at, setAt] = useState(0);
  const note = notes[at];
  if (note === undefined) return null;
  const isLast = at === notes.length - 1;
  const close = () => {
    setAt(notes.length);
    // Without an answer they come again on the next visit, where they can be closed again.
    void closeTour().catch(() => undefined);
  };
  return (
    <section
      aria-label={t('name')}
      className="fixed inset-x-0 bottom-tabs z-10 border-t-stop border-ink bg-paper-lift p-4 pt-3 md:inset-x-auto md:right-6 md:bottom-6 md:w-84 md:border-due [@media(scripting:none)]:hidden"
    >
      <p className="text-fine text-ink-2">{t('count', { note: at + 1, all: notes.length })}</p>
      <div aria-live="polite">
        <h2 className="font-display text-section">{t(`${note}.title`)}</h2>
        <p className="mt-0.5 text-small">{t(`${note}.words`)}</p>
      </div>
      <div className="mt-2.5 flex flex-wrap gap-2.5">
        <Button size="small" variant="primary" onClick={isLast ? close : () => setAt(at + 1)}>
          {isLast ? t('done') : t('next')}
        </Button>
        {isLast ? null : (
          <Button size="small" variant="quiet" onClick={close}>
            {t('close')}
          </Button>
        )}
      </div>
    </section>
  );
}
