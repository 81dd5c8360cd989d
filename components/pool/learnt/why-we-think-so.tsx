'use client';

import { useTranslations } from 'next-intl';
import { useId, useState } from 'react';
import { Button } from '@/components/ui/button';
import type { Learnt, LearntRow } from '@/lib/schemas/learnt';
import { useFigures } from './use-figures';
import { stoodOutFor, useStoodOutWords } from './use-stood-out-words';

const MOST_SHOWN = 5;

/** How many tests say so, what was assumed before them, and which of them stood out. */
export function WhyWeThinkSo({ row, learnt, name }: { row: LearntRow; learnt: Learnt; name: string }) {
  const t = useTranslations('learnt');
  const { figure, withUnit } = useFigures(row);
  const wordsOf = useStoodOutWords();
  const [open, setOpen] = useState(false);
  const id = useId();
  const notes = stoodOutFor(row.thing, learnt.stoodOut);
  const { p10, p90 } = row.before;
  return (
    <>
      <Button
        variant="quiet"
        size="small"
        className="-ml-1.5"
        aria-expanded={open}
        aria-controls={id}
        aria-label={t('why.openFor', { name })}
        onClick={() => setOpen(!open)}
      >
        {t('why.open')}
      </Button>
      <div id={id} hidden={!open} className="text-small text-ink-2">
        <p>{t('why.counted', { readings: learnt.readings, counted: row.readings })}</p>
        <p>{t('why.before', { range: withUnit(t('range', { low: figure(p10), high: figure(p90) })) })}</p>
        {notes.length === 0 ? (
          <p>{t('why.nothing')}</p>
        ) : (
          <ul className="mt-1 grid gap-1">
            {notes.slice(0, MOST_SHOWN).map((note) => (
              <li key={`${note.takenAt} ${note.quantity}`} className="border-t border-rule pt-1">
                {wordsOf(note)}
              </li>
            ))}
            {notes.length > MOST_SHOWN ? (
              <li className="border-t border-rule pt-1">{t('why.older', { count: notes.length - MOST_SHOWN })}</li>
            ) : null}
          </ul>
        )}
      </div>
    </>
  );
}
