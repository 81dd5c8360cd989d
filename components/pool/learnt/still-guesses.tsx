'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { learntOptions } from '@/lib/client/learnt';
import { guessedThings } from './has-taught';

/** What no number of tests has settled yet. */
export function StillGuesses() {
  const t = useTranslations('learnt');
  const { data } = useQuery(learntOptions());
  const things = data ? guessedThings(data) : [];
  if (things.length === 0) return null;
  const names = things.map((thing) => t(`thing.${thing}.name`)).join(t('listJoiner'));
  return (
    <section className="border-t border-rule pt-3.5 pb-4">
      <h2 className="font-display text-section">{t('guesses.title')}</h2>
      <p className="text-body">{t('guesses.words', { things: names })}</p>
    </section>
  );
}
