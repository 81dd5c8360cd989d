'use client';

import { useTranslations } from 'next-intl';
import { ChartPatterns } from '@/components/charts/patterns';
import { shareOf, type TimeAxis } from '@/components/charts/time-axis';
import { useElementWidth } from '@/components/week-sheet/use-element-width';
import type { OpenSituation } from '@/lib/schemas/situation';
import { HourMarks } from './hour-marks';
import { LaneGrid } from './lane-grid';
import { MorningsLane } from './mornings-lane';
import { useHousehold } from './situation-context';
import type { StepDay } from './step-days';
import { StepColumns } from './step-columns';
import { StepDayName } from './step-list';
import { LazyTreatmentCursor, TREATMENT, TreatmentChlorine } from './treatment-chlorine';
import type { TreatmentChart } from './treatment-picture';

type Props = {
  open: OpenSituation;
  chart: TreatmentChart;
  days: readonly StepDay[];
  now: number;
  /** Steps under their days; on a phone they stand below as a list. */
  withSteps: boolean;
};

/** Narrowest a day can be read [px]. */
const DAY = 132;

/** Free chlorine, mornings and steps on one time axis, day by day. */
export function TreatmentSheet({ open, chart, days, now, withSteps }: Props) {
  const t = useTranslations('situations.chart');
  const { timeZone } = useHousehold();
  const [width, plot] = useElementWidth();
  const axis: TimeAxis = { from: days[0]?.from ?? 0, to: days.at(-1)?.to ?? 1 };
  return (
    <div
      role="region"
      aria-label={t('scroll')}
      tabIndex={0}
      className="overflow-x-auto [--gutter:96px] lg:[--gutter:118px]"
    >
      <div className="relative" style={{ minWidth: `calc(var(--gutter) + ${days.length * DAY}px)` }}>
        <ChartPatterns />
        <div ref={plot} className="pointer-events-none absolute inset-y-0 right-0 left-[var(--gutter)]">
          {days.map(({ from }) => (
            <div
              key={from}
              aria-hidden="true"
              className="absolute inset-y-0 border-l border-rule"
              style={{ left: `${shareOf(axis, from) * 100}%` }}
            />
          ))}
          <LazyTreatmentCursor axis={axis} syncId={TREATMENT} />
        </div>
        <LaneGrid days={days} name={null}>
          {(day) => (
            <div className="relative h-12.5">
              <StepDayName day={day.day} now={now} inColumn />
              <HourMarks day={day} timeZone={timeZone} />
            </div>
          )}
        </LaneGrid>
        <TreatmentChlorine open={open} chart={chart} axis={axis} now={now} width={width} />
        <MorningsLane days={days} open={open} />
        {withSteps && <StepColumns days={days} open={open} now={now} />}
      </div>
    </div>
  );
}
