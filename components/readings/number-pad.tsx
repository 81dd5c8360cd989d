'use client';

import { Delete } from 'lucide-react';
import { useTranslations } from 'next-intl';
import { formatNumber } from '@/lib/units/format';
import { useReadingSetting } from './reading-setting';

const key =
  'flex h-11 cursor-pointer items-center justify-center rounded border-control border-ink bg-paper-lift text-[20px] leading-none font-control select-none active:bg-ink active:text-on-ink';

/** Keys under the thumb. They never take the cursor out of the field that is being filled. */
export function NumberPad({
  onDigit,
  onDelete,
  onClear,
  onNext,
}: {
  onDigit: (character: string) => void;
  onDelete: () => void;
  onClear: () => void;
  onNext: () => void;
}) {
  const t = useTranslations('readings.pad');
  const { locale } = useReadingSetting();
  const decimalSign = formatNumber(0.5, { decimals: 1, locale }).charAt(1);
  const characters = ['1', '2', '3', '4', '5', '6', '7', '8', '9', decimalSign, '0'];
  const stay = (event: React.PointerEvent) => event.preventDefault();
  return (
    <div role="group" aria-label={t('label')} className="grid grid-cols-3 gap-1.75">
      {characters.map((character) => (
        <button
          key={character}
          type="button"
          className={key}
          onPointerDown={stay}
          onClick={() => onDigit(character)}
          aria-label={character === decimalSign ? t('decimal') : undefined}
        >
          {character}
        </button>
      ))}
      <button type="button" className={key} onPointerDown={stay} onClick={onDelete} aria-label={t('delete')}>
        <Delete aria-hidden="true" className="size-5.5" />
      </button>
      <button type="button" className={`${key} text-[16px]`} onPointerDown={stay} onClick={onClear}>
        {t('clear')}
      </button>
      <button type="button" className={`${key} col-span-2 text-[16px]`} onPointerDown={stay} onClick={onNext}>
        {t('next')}
      </button>
    </div>
  );
}
