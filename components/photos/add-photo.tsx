'use client';

import { Camera } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { useState } from 'react';
import { buttonClass } from '@/components/ui/button-class';
import { Spinner } from '@/components/ui/spinner';
import { RequestProblem } from '@/lib/client/fetch-json';
import { useAddPhoto } from '@/lib/client/photos';
import { useProblemWords } from '@/lib/messages/use-problem-words';
import type { PhotoKind } from '@/lib/schemas/photo';

type Props = {
  kind: PhotoKind;
  /** The reading or the product that it belongs to. */
  about?: string;
  caption?: string | undefined;
  label: string;
  onAdded?: () => void;
};

const MEGABYTE = 1024 * 1024;
/** As the server has it, which says so, too. */
const MOST_MEGABYTES = 8;
/** What the camera of a phone then hands over, whatever it keeps for itself. */
const accepted = 'image/jpeg,image/png,image/webp';

/** Takes or chooses a photo and sends it at once. */
export function AddPhoto({ kind, about, caption, label, onAdded }: Props) {
  const t = useTranslations('photos');
  const problemWords = useAddProblem();
  const add = useAddPhoto();
  const [tooLarge, setTooLarge] = useState<number>();
  const send = (file: File) => {
    const isTooLarge = file.size > MOST_MEGABYTES * MEGABYTE;
    setTooLarge(isTooLarge ? file.size : undefined);
    if (isTooLarge) return add.reset();
    add.mutate(
      { id: crypto.randomUUID(), kind, file, ...(about && { about }), ...(caption && { caption }) },
      {
        onSuccess: () => onAdded?.(),
      },
    );
  };
  const problem =
    tooLarge === undefined
      ? add.error && problemWords(add.error)
      : t('tooLarge', { most: MOST_MEGABYTES, size: Math.ceil(tooLarge / MEGABYTE) });
  return (
    <div>
      <label
        className={buttonClass({
          size: 'small',
          className:
            'relative has-[input:focus-visible]:outline-3 has-[input:focus-visible]:outline-offset-1 has-[input:focus-visible]:outline-teal',
        })}
      >
        {add.isPending ? <Spinner /> : <Camera aria-hidden="true" className="size-4.5" />}
        {add.isPending ? t('sending') : label}
        <input
          type="file"
          accept={accepted}
          className="absolute inset-0 cursor-pointer opacity-0 outline-none"
          disabled={add.isPending}
          onChange={({ target }) => {
            const file = target.files?.[0];
            // The same file may be chosen again after a refusal.
            target.value = '';
            if (file) send(file);
          }}
        />
      </label>
      {problem ? (
        <p role="alert" className="mt-1.5 text-small font-emphasis text-terra-ink">
          {problem}
        </p>
      ) : null}
    </div>
  );
}

/** What the server says of a picture is said to whoever took it. */
function useAddProblem() {
  const words = useProblemWords();
  return (problem: Error) =>
    problem instanceof RequestProblem && ['invalid-input', 'conflict', 'not-found'].includes(problem.code)
      ? (problem.at('bytes') ?? problem.message)
      : words(problem);
}
