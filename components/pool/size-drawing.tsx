'use client';

import { useTranslations } from 'next-intl';
import { formatForInput, formatQuantityIn } from '@/lib/units/format';
import { parseQuantity } from '@/lib/units/parse';
import { toInside } from '@/lib/units/unit';
import { type DrawnPool, type Measure, placeholder } from './drawing/drawn-pool';
import { PoolDrawing } from './drawing/pool-drawing';
import { usePoolSetting } from './setting';
import { type LengthField, lengthUnit, type SizeDraft } from './size-draft';

/** The drawing follows what is typed; what is missing or cannot be is dotted in at a usual size. */
export function SizeDrawing({
  draft,
  change,
  words,
  whenNear,
}: {
  draft: SizeDraft;
  /** Left out where the drawing is only shown. */
  change?: (part: Partial<SizeDraft>) => void;
  words: string | undefined;
  /** Drawn when it comes near what is seen of the page; its place is kept for it. */
  whenNear?: boolean;
}) {
  const t = useTranslations('pool');
  const units = useTranslations('units');
  const { locale } = usePoolSetting();
  const unit = lengthUnit(draft.system);
  const fieldOf = (measure: Measure): LengthField => {
    if (measure === 'length' && draft.shape === 'round') return 'diameter';
    return measure === 'shallow' && draft.floor === 'flat' ? 'depth' : measure;
  };
  const metres = (measure: Measure) => {
    const value = parseQuantity(draft[fieldOf(measure)], 'length', unit);
    return value !== undefined && value > 0.1 && value <= 60 ? value : undefined;
  };
  const figure = (measure: Measure) => {
    const value = metres(measure);
    if (value === undefined) return undefined;
    return units(unit, { value: formatQuantityIn(value, 'length', unit, locale).value });
  };
  const drawn = (measure: Measure) => metres(measure) ?? placeholder[measure];
  const length = drawn('length');
  const width = draft.shape === 'round' ? length : drawn('width');
  const shallow = drawn('shallow');
  const pool: DrawnPool = {
    shape: draft.shape,
    length,
    width,
    secondWidth: draft.shape === 'freeform' ? drawn('secondWidth') : width,
    floor: draft.floor,
    shallow,
    deep: draft.floor === 'flat' ? shallow : Math.max(shallow, drawn('deep')),
  };
  const figures = Object.fromEntries(
    (['length', 'width', 'secondWidth', 'shallow', 'deep'] as const).flatMap((measure) => {
      const text = figure(measure);
      return text === undefined ? [] : [[measure, text]];
    }),
  );
  const said = (measure: Measure) => figure(measure) ?? t('drawing.unknown');
  return (
    <PoolDrawing
      pool={pool}
      figures={figures}
      words={words}
      whenNear={whenNear}
      label={t('drawing.label', {
        shape: t(`size.shape.${draft.shape}`),
        length: said('length'),
        width: draft.shape === 'round' ? said('length') : said('width'),
        shallow: said('shallow'),
        deep: draft.floor === 'flat' ? said('shallow') : said('deep'),
      })}
      onPull={
        change &&
        ((measure, pulled) => {
          // In feet the nearest tenth, so that what is written reads like a tape measure.
          const metric = draft.system === 'metric';
          const length = metric ? pulled : toInside(Math.round(pulled / toInside(0.1, unit)) / 10, unit);
          change({ [fieldOf(measure)]: formatForInput(length, 'length', unit, locale) });
        })
      }
    />
  );
}
