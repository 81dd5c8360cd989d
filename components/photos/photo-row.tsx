'use client';

import { useQuery } from '@tanstack/react-query';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Dialog } from '@/components/ui/dialog';
import { dayWithYear } from '@/lib/calendar/format';
import { dayOf } from '@/lib/calendar/household-day';
import { pictureAddress, photosOptions, useRemovePhoto } from '@/lib/client/photos';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { Photo } from '@/lib/schemas/photo';

/** How a household writes days. */
export type PhotoSetting = { timeZone: string; locale: string };

/** Small copies of photos in a row, each of which opens large. Nothing where there are none. */
export function PhotoRow({ photos, setting }: { photos: readonly Photo[]; setting: PhotoSetting }) {
  const named = useNames(setting);
  const [open, setOpen] = useState<Photo>();
  if (photos.length === 0) return null;
  return (
    <>
      <ul className="flex flex-wrap gap-2.5">
        {photos.map((photo) => (
          <li key={photo.id} className="w-24">
            <button type="button" onClick={() => setOpen(photo)} className="block cursor-pointer border border-ink">
              <Picture photo={photo} size="small" alt={named(photo)} className="size-24 object-cover" />
            </button>
            {photo.caption === null ? null : (
              <span className="mt-1 block text-fine break-words text-ink-2">{photo.caption}</span>
            )}
          </li>
        ))}
      </ul>
      {open === undefined ? null : <LargePhoto photo={open} setting={setting} onClose={() => setOpen(undefined)} />}
    </>
  );
}

/** The photos of one kind, or of one thing; undefined until they are there. */
export function usePhotos(of: (photo: Photo) => boolean) {
  const { data, error, refetch } = useQuery(photosOptions());
  return { photos: data?.filter(of), problem: data === undefined ? error : null, refetch };
}

type LargeProps = { photo: Photo; setting: PhotoSetting; onClose: () => void };

function LargePhoto({ photo, setting, onClose }: LargeProps) {
  const t = useTranslations('photos');
  const common = useTranslations('common');
  const problemWords = useProblemWords();
  const named = useNames(setting);
  const remove = useRemovePhoto();
  const when = useWhen(setting)(photo);
  return (
    <Dialog
      open
      onOpenChange={(open) => {
        if (!open) onClose();
      }}
      title={photo.caption ?? named(photo)}
      description={photo.addedBy === null ? t('added', { when }) : t('by', { name: photo.addedBy, when })}
      closeLabel={common('close')}
      actions={
        <>
          <Button onClick={onClose}>{common('close')}</Button>
          {photo.removable ? (
            <Button
              variant="quiet"
              busy={remove.isPending ? t('removing') : undefined}
              onClick={() => remove.mutate(photo.id, { onSuccess: onClose })}
            >
              {t('remove')}
            </Button>
          ) : null}
        </>
      }
    >
      <Picture photo={photo} size="whole" alt={named(photo)} className="mx-auto max-h-[60vh] w-auto max-w-full" />
      {remove.error === null ? null : <p role="alert">{problemWords(remove.error)}</p>}
    </Dialog>
  );
}

type PictureProps = { photo: Photo; size: 'small' | 'whole'; alt: string; className: string };

function Picture({ photo: { id, width, height }, size, alt, className }: PictureProps) {
  return (
    // The server has made both copies; another that resized them would pass by the gate of the household.
    // eslint-disable-next-line @next/next/no-img-element -- see above
    <img
      src={pictureAddress(id, size)}
      width={width}
      height={height}
      loading="lazy"
      decoding="async"
      alt={alt}
      className={className}
    />
  );
}

function useWhen({ timeZone, locale }: PhotoSetting) {
  return ({ addedAt }: Photo) => dayWithYear(dayOf(Date.parse(addedAt), timeZone), locale);
}

function useNames(setting: PhotoSetting) {
  const t = useTranslations('photos');
  const when = useWhen(setting);
  return (photo: Photo) =>
    t('named', {
      kind: photo.kind,
      caption: photo.caption === null ? 'none' : 'some',
      words: photo.caption ?? '',
      when: when(photo),
    });
}
