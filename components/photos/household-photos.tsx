'use client';

import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { ProblemState } from '@/components/ui/problem-state';
import { Skeleton } from '@/components/ui/skeleton';
import { TextField } from '@/components/ui/text-field';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import { AddPhoto } from './add-photo';
import { PhotoRow, type PhotoSetting, usePhotos } from './photo-row';

/** Every photo of the household, and a way to add one of its equipment. */
export function HouseholdPhotos({ setting, mayAdd }: { setting: PhotoSetting; mayAdd: boolean }) {
  const t = useTranslations('photos');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const { photos, problem, refetch } = usePhotos(() => true);
  const [caption, setCaption] = useState('');
  return (
    <section aria-labelledby="photos" className="mx-auto max-w-sheet px-margin pb-8">
      <h2 id="photos" className="border-t border-ink pt-2.5 font-display text-section">
        {t('title')}
      </h2>
      <p className="max-w-reading pb-3 text-small text-ink-2">{t('lead')}</p>
      {photos === undefined && problem === null ? <Skeleton label={t('loading')} className="h-24" /> : null}
      {problem === null ? null : (
        <ProblemState
          title={t('notLoaded')}
          action={<Button onClick={() => void refetch()}>{common('tryAgain')}</Button>}
        >
          {problemWords(problem)}
        </ProblemState>
      )}
      {photos?.length === 0 ? <p className="text-body">{t('none')}</p> : null}
      <PhotoRow photos={photos ?? []} setting={setting} />
      {mayAdd ? (
        <div className="mt-4 grid max-w-form gap-2.5">
          <TextField
            label={t('caption')}
            hint={t('captionHint')}
            value={caption}
            maxLength={120}
            onChange={({ target }) => setCaption(target.value)}
          />
          <AddPhoto
            kind="equipment"
            caption={caption.trim() || undefined}
            label={t('addEquipment')}
            onAdded={() => setCaption('')}
          />
        </div>
      ) : null}
    </section>
  );
}
