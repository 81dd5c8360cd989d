'use client';

import dynamic from 'next/dynamic';
import { useTranslations } from 'next-intl';
import { untilFetched } from '@/components/ui/until-fetched';
import { ticksOf, type ValueAxis } from '@/components/charts/value-axis';
import { limits } from '@/lib/standards/limits';
import { WEEK } from './cursor-names';
import { Lane } from './lane';
import { AxisFigures, LaneName } from './lane-name';
import { useSheet } from './sheet-context';
import { useUnits } from './use-units';

/** What is drawn in the lanes comes after the page, and their places are kept for it. */
const LazyChlorinePicture = dynamic(
  () => untilFetched(() => import('./lane-pictures')).then((part) => part.ChlorinePicture),
  {
    ssr: false,
  },
);
export const LazyChlorineDayPicture = dynamic(
  () => untilFetched(() => import('./lane-pictures')).then((part) => part.ChlorineDayPicture),
  {
    ssr: false,
  },
);
const LazyQuantityPicture = dynamic(
  () => untilFetched(() => import('./lane-pictures')).then((part) => part.QuantityPicture),
  {
    ssr: false,
  },
);
export const LazyPlumbLines = dynamic(
  () => untilFetched(() => import('./plumb-lines')).then((part) => part.PlumbLines),
  { ssr: false },
);

/** The hour that is read, in the lanes beside the charts. It comes with the charts, for there is no reading without them. */
export const LazyCursorLine = dynamic(
  () => untilFetched(() => import('@/components/charts/cursor-line')).then((part) => part.CursorLine),
  {
    ssr: false,
  },
);

/** The hour that is read in a chart, through the lanes that are none; `height`: down to where the lanes end [px]. */
export function WeekCursorLine({ height }: { height: number }) {
  const { axis } = useSheet().picture;
  return <LazyCursorLine axis={axis} syncId={WEEK} height={height} />;
}

/** `width`: of the plot [px]; nothing is drawn before it is known. */
type LaneProps = { width: number; value: ValueAxis };

/** Free chlorine between its limits. */
export function ChlorineWeekLane({ width, value }: LaneProps) {
  const t = useTranslations('week.lane');
  const { sheet } = useSheet();
  const units = useUnits();
  const { swimLimit } = sheet.pool;
  const figures = [...new Set([...ticksOf(value), swimLimit])].map((at) => ({
    at,
    words: units.number(at),
    limit: at === swimLimit,
  }));
  return (
    <Lane
      name="chlorine"
      gutter={
        <>
          <LaneName name={t('chlorine')} note={units.unitOf('freeChlorine')} tone="teal" />
          <AxisFigures value={value} figures={figures} />
        </>
      }
    >
      {width > 0 && <LazyChlorinePicture width={width} value={value} />}
    </Lane>
  );
}

export function PHLane({ width, value }: LaneProps) {
  const t = useTranslations('week.lane');
  const units = useUnits();
  const keep = [limits.pHRangeLow.value, limits.pHRangeHigh.value] as const;
  const [low, high] = keep.map((level) => units.figure(level, 'pH'));
  return (
    <Lane
      name="pH"
      gutter={
        <>
          <LaneName name={t('pH')} note={t('keepPH', { low: low ?? '', high: high ?? '' })} tone="plum" />
          <AxisFigures value={value} figures={keep.map((at) => ({ at, words: units.figure(at, 'pH') }))} />
        </>
      }
    >
      {width > 0 && <LazyQuantityPicture quantity="pH" width={width} value={value} keep={keep} forbidden={[]} />}
    </Lane>
  );
}

export function StabilizerLane({ width, value }: LaneProps) {
  const t = useTranslations('week.lane');
  const units = useUnits();
  const { sheet } = useSheet();
  const [low, high] = sheet.pool.stabilizerBand;
  const words = { low: units.figure(low, 'cyanuricAcid'), high: units.figure(high, 'cyanuricAcid') };
  return (
    <Lane
      name="stabilizer"
      gutter={
        <>
          <LaneName name={t('stabilizer')} note={t('keepStabilizer', words)} tone="ochre" />
          <AxisFigures
            value={value}
            figures={[low, high].map((at) => ({ at, words: units.figure(at, 'cyanuricAcid') }))}
          />
        </>
      }
    >
      {width > 0 && (
        <LazyQuantityPicture
          quantity="cyanuricAcid"
          width={width}
          value={value}
          keep={[low, high]}
          forbidden={[high]}
        />
      )}
    </Lane>
  );
}
