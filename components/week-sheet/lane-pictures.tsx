'use client';

import { useMemo } from 'react';
import { rowsOf } from '@/components/charts/chart-rows';
import { ChlorineLane } from '@/components/charts/chlorine-lane';
import type { LaneTime } from '@/components/charts/lane-chart';
import { QuantityLane } from '@/components/charts/quantity-lane';
import { cutTo, type TimeAxis } from '@/components/charts/time-axis';
import type { ValueAxis } from '@/components/charts/value-axis';
import { wholeCourse } from '@/components/charts/water-curve';
import { TriedLineLayer } from '@/components/try-out/tried-line-layer';
import { chartDoses, chartTests } from './chart-input';
import { TODAY, WEEK } from './cursor-names';
import { useSheet } from './sheet-context';
import { courseOn } from './sheet-picture';
import { useChlorinePhrases, useQuantityPhrases } from './use-chart-phrases';
import { useDoseWords } from './use-dose-words';

/** `width`: of the plot [px]. */
type PictureProps = { width: number; value: ValueAxis };

/** What is drawn of free chlorine in the week, with its words. */
export function ChlorinePicture({ width, value }: PictureProps) {
  const { sheet, picture } = useSheet();
  const doses = chartDoses(sheet.doses, useDoseWords());
  const phrases = useChlorinePhrases();
  return (
    <>
      <ChlorineLane
        {...phrases}
        span="week"
        time={useLaneTime(width)}
        value={value}
        rows={picture.rows}
        points={picture.points}
        limits={picture.swimLimits}
        swimLimit={sheet.pool.swimLimit}
        swimHours={picture.swimHours}
        doses={doses}
        tests={chartTests(sheet.readings, 'freeChlorine')}
        planEndsAt={picture.planEndsAt}
      />
      <TriedLineLayer axis={picture.axis} width={width} value={value} />
    </>
  );
}

/** The same of one day. */
export function ChlorineDayPicture({ axis, width, value }: PictureProps & { axis: TimeAxis }) {
  const { sheet, picture } = useSheet();
  const doses = chartDoses(sheet.doses, useDoseWords());
  const phrases = useChlorinePhrases(axis);
  const course = useMemo(() => courseOn(sheet, axis), [sheet, axis]);
  const nights = picture.nights.flatMap((night) => cutTo(axis, night) ?? []);
  const limits = picture.swimLimits.flatMap((limit) => {
    const cut = cutTo(axis, limit);
    return cut ? [{ ...limit, ...cut }] : [];
  });
  return (
    <>
      <ChlorineLane
        {...phrases}
        span="day"
        time={{ axis, nights, now: picture.now, width, syncId: TODAY }}
        value={value}
        rows={rowsOf(course)}
        points={wholeCourse(course)}
        limits={limits}
        swimLimit={sheet.pool.swimLimit}
        swimHours={picture.swimHours.flatMap((hours) => cutTo(axis, hours) ?? [])}
        doses={doses}
        tests={chartTests(sheet.readings, 'freeChlorine').filter(({ at }) => at >= axis.from && at < axis.to)}
        planEndsAt={picture.planEndsAt}
      />
      <TriedLineLayer axis={axis} width={width} value={value} />
    </>
  );
}

export type QuantityPictureProps = PictureProps & {
  quantity: 'pH' | 'cyanuricAcid';
  keep: readonly [number, number];
  /** Levels hatched on their upper side. */
  forbidden: readonly number[];
};

/** What is drawn of pH or of stabilizer. */
export function QuantityPicture({ quantity, width, value, keep, forbidden }: QuantityPictureProps) {
  const { sheet, picture } = useSheet();
  const doses = chartDoses(sheet.doses, useDoseWords());
  const phrases = useQuantityPhrases(quantity, keep);
  return (
    <QuantityLane
      {...phrases}
      quantity={quantity}
      time={useLaneTime(width)}
      value={value}
      rows={picture.rows}
      points={picture.points}
      keep={keep}
      limits={forbidden.map((level) => ({ ...picture.axis, value: level, forbidden: 'above' }))}
      doses={doses}
      tests={chartTests(sheet.readings, quantity)}
    />
  );
}

function useLaneTime(width: number): LaneTime {
  const { axis, nights, now } = useSheet().picture;
  return { axis, nights, now, width, syncId: WEEK };
}
