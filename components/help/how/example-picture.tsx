'use client';

import { useTranslations } from 'next-intl';
import { PictureOrTable } from '@/components/ui/picture-or-table';
import type { Curve, Line } from '@/lib/client/worked-out/examples/curve';
import type { HowPage } from '@/lib/client/worked-out/how-page';
import { DrawnCurve } from './drawn-curve';
import { TakenBars } from './taken-bars';
import { useCurveSentence } from './use-curve-sentence';
import { useWritten } from './use-written';

const TABLE_ROWS = 8;

/** The drawn example with its sentence, and the same as a table. */
export function ExamplePicture({ page, curve }: { page: HowPage; curve: Curve }) {
  const t = useTranslations('how-examples');
  const written = useWritten();
  const sentenceOf = useCurveSentence();
  const lines: readonly Line[] = [
    ...curve.lines.filter(({ name }) => !curve.ranges?.some((range) => range.name === name)),
  ];
  const first = lines[0]?.points ?? [];
  const every = Math.max(1, Math.round((first.length - 1) / TABLE_ROWS));
  const rows = first.filter((_, index) => index % every === 0);
  return (
    <PictureOrTable
      className="mt-4"
      sentence={sentenceOf(page, curve)}
      seeTable={t('table')}
      seePicture={t('picture')}
      picture={
        <>
          <DrawnCurve curve={curve} />
          {curve.taken === undefined ? null : <TakenBars across={curve.across} taken={curve.taken} />}
        </>
      }
      table={{
        columns: [t('at'), ...lines.map(({ name }) => t(`figure.${name}`))],
        rows: rows.map(([across], row) => [
          written(across, curve.across),
          ...lines.map(({ points }) =>
            written(points[row * every]?.[1] ?? 0, { ...curve.up, decimals: curve.up.decimals + 2 }),
          ),
        ]),
      }}
    />
  );
}
