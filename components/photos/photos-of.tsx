'use client';

import { useTranslations } from 'next-intl';
import { AddPhoto } from './add-photo';
import { PhotoRow, type PhotoSetting, usePhotos } from './photo-row';

type Props = {
  kind: 'strip' | 'label';
  /** The reading or the product. */
  about: string;
  setting: PhotoSetting;
};

/** The photos of one strip or one label, and a way to add one. */
export function PhotosOf({ kind, about, setting }: Props) {
  const t = useTranslations('photos');
  const { photos = [] } = usePhotos((photo) => photo.kind === kind && photo.about === about);
  return (
    <div className="grid gap-2.5">
      <PhotoRow photos={photos} setting={setting} />
      <AddPhoto kind={kind} about={about} label={t(kind === 'strip' ? 'addStrip' : 'addLabel')} />
    </div>
  );
}
