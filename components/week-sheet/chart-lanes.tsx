'use client';

import dynamic from 'next/dynamic';
import { useTranslations } from 'next-intl';
import type { LaneTime } from '@/components/charts/lane-chart';
import { ticksOf, type ValueAxis } from '@/components/charts/value-axis';
import { TriedLineLayer } from '@/components/try-out/tried-line-layer';
import { limits } from '@/lib/standards/limits';
import { chartDoses, chartTests } from './chart-input';
import { Lane } from './lane';
import { AxisFigures, LaneName } from './lane-name';
import { useSheet } from './sheet-context';
import { useChlorinePhrases, useQuantityPhrases } from './use-chart-phrases';
import { useDoseWords } from './use-dose-words';
import { useUnits } from './use-units';

export const LazyChlorineLane = dynamic(
  () => import('@/components/charts/chlorine-lane').then((part) => part.ChlorineLane),
  {
    ssr: false,
  },
);
const LazyQuantityLane = dynamic(() => import('@/components/charts/quantity-lane').then((part) => part.QuantityLane), {
  ssr: false,
});

/** The hour that is read, in the lanes beside the charts. It comes with the charts, for there is no reading without them. */
export const LazyCursorLine = dynamic(() => import('@/components/charts/cursor-line').then((part) => part.CursorLine), {
  ssr: false,
});

/** One cursor for all lanes. */
const SYNC = 'week-sheet';

/** The hour that is read in a chart, through the lanes that are none; `height`: down to where the lanes end [px]. */
export function WeekCursorLine({ height }: { height: number }) {
  const { axis } = useSheet().picture;
  return <LazyCursorLine axis={axis} syncId={SYNC} height={height} />;
}

function useLaneTime(width: number): LaneTime {
  const { axis, nights, now } = useSheet().picture;
  return { axis, nights, now, width, syncId: SYNC };
}

/** `width`: of the plot [px]; nothing is drawn before it is known. */
type LaneProps = { width: number; value: ValueAxis };

/** Free chlorine between its limits. */
export function ChlorineWeekLane({ width, value }: LaneProps) {
  const t = useTranslations('week.lane');
  const { sheet, picture } = useSheet();
  const units = useUnits();
  const doses = chartDoses(sheet.doses, useDoseWords());
  const tests = chartTests(sheet.readings, 'freeChlorine');
  const phrases = useChlorinePhrases();
  const time = useLaneTime(width);
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
      {width > 0 && (
        <LazyChlorineLane
          {...phrases}
          span="week"
          time={time}
          value={value}
          rows={picture.rows}
          points={picture.points}
          limits={picture.swimLimits}
          swimLimit={swimLimit}
          swimHours={picture.swimHours}
          doses={doses}
          tests={tests}
          planEndsAt={picture.planEndsAt}
        />
      )}
      <TriedLineLayer axis={time.axis} width={width} value={value} />
    </Lane>
  );
}

export function PHLane({ width, value }: LaneProps) {
  const t = useTranslations('week.lane');
  const units = useUnits();
  const { sheet } = useSheet();
  const tests = chartTests(sheet.readings, 'pH');
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
      <LowLane quantity="pH" width={width} value={value} keep={keep} tests={tests} forbidden={[]} />
    </Lane>
  );
}

export function StabilizerLane({ width, value }: LaneProps) {
  const t = useTranslations('week.lane');
  const units = useUnits();
  const { sheet } = useSheet();
  const tests = chartTests(sheet.readings, 'cyanuricAcid');
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
      <LowLane
        quantity="cyanuricAcid"
        width={width}
        value={value}
        keep={[low, high]}
        tests={tests}
        forbidden={[high]}
      />
    </Lane>
  );
}

type LowLaneProps = LaneProps & {
  quantity: 'pH' | 'cyanuricAcid';
  keep: readonly [number, number];
  tests: ReturnType<typeof chartTests>;
  /** Levels hatched on their upper side. */
  forbidden: readonly number[];
};

function LowLane({ quantity, width, value, keep, tests, forbidden }: LowLaneProps) {
  const { sheet, picture } = useSheet();
  const phrases = useQuantityPhrases(quantity, keep);
  const doses = chartDoses(sheet.doses, useDoseWords());
  const time = useLaneTime(width);
  if (width === 0) return null;
  return (
    <LazyQuantityLane
      {...phrases}
      quantity={quantity}
      time={time}
      value={value}
      rows={picture.rows}
      points={picture.points}
      keep={keep}
      limits={forbidden.map((level) => ({ ...picture.axis, value: level, forbidden: 'above' }))}
      doses={doses}
      tests={tests}
    />
  );
}
