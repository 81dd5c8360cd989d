'use client';

import { useTranslations } from 'next-intl';
import { PictureOrTable } from '@/components/ui/picture-or-table';
import type { Curve } from '@/lib/client/worked-out/examples/curve';
import type { HowPage } from '@/lib/client/worked-out/how-page';
import { curveColumns } from './curve-columns';
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
  const first = curve.lines[0]?.points ?? [];
  const every = Math.max(1, Math.round((first.length - 1) / TABLE_ROWS));
  const places = first.filter((_, index) => index % every === 0).map(([across]) => across);
  const columns = curveColumns(curve, places);
  const inTable = { ...curve.up, decimals: curve.up.decimals + 2 };
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
        columns: [
          t('at'),
          ...columns.map(({ name, edge = 'whole' }) => t('column', { name: t(`figure.${name}`), edge })),
        ],
        rows: places.map((place, row) => [
          written(place, curve.across),
          ...columns.map(({ valueAt }) => {
            const value = valueAt(row);
            return value === undefined ? '' : written(value, inTable);
          }),
        ]),
      }}
    />
  );
}
