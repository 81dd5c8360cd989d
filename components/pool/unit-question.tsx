'use client';

import { useTranslations } from 'next-intl';
import { Button } from '@/components/ui/button';
import { Callout } from '@/components/ui/callout';
import { toInside } from '@/lib/units/unit';
import type { UnitQuestion as Question, VolumeUnit } from '@/lib/units/unit-mistake';
import { olympicPool, VolumeComparison } from './volume-comparison';
import { useVolumeWords } from './volume-words';

/** A volume that looks as if it was meant in another unit is asked about before anything is worked out from it. */
export function UnitQuestion({
  question,
  value,
  typed,
  unit,
  onLikelier,
  onConfirm,
}: {
  question: Required<Question>;
  value: number;
  /** The figure exactly as it stands in the field. */
  typed: string;
  unit: VolumeUnit;
  onLikelier: (unit: VolumeUnit) => void;
  onConfirm: () => void;
}) {
  const t = useTranslations('pool.size.doubt');
  const unitName = useTranslations('pool.unit.name');
  const common = useTranslations('common');
  const words = useVolumeWords();
  const volume = toInside(value, unit);
  const { likelier } = question;
  const facts = {
    typed: `${typed.trim()} ${unitName(unit)}`,
    volume: words.inUnit(volume, 'm3'),
    likelier: `${typed.trim()} ${unitName(likelier.unit)}`,
    likelierUnit: unitName(likelier.unit),
    likelierVolume: words.inUnit(likelier.volume, likelier.unit === 'm3' ? 'us-gal' : 'm3'),
    unit: unitName(unit),
  };
  const olympic = Math.round(volume / olympicPool.volume);
  const size = olympic >= 1 ? 'huge' : question.possible ? 'rare' : volume < 1 ? 'tiny' : 'large';
  return (
    <div role="group" aria-label={common('takeCare')} className="mt-3">
      <Callout
        severity="take-care"
        word={common('takeCare')}
        actions={
          <>
            <Button variant="primary" wide onClick={() => onLikelier(likelier.unit)}>
              {t('yes', facts)}
            </Button>
            <Button wide onClick={onConfirm} className="bg-paper-lift!">
              {t('no', facts)}
            </Button>
          </>
        }
      >
        <p>{t(size, { ...facts, count: olympic })}</p>
        <div className="mt-3 -ml-9.5 sm:ml-0">
          <VolumeComparison
            typed={volume}
            likely={likelier.volume}
            label={t('picture', facts)}
            likelyFigure={words.inUnit(likelier.volume, 'm3')}
            toScale={t('toScale')}
          />
        </div>
      </Callout>
    </div>
  );
}
