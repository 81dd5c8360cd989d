'use client';

import dynamic from 'next/dynamic';
import { useTranslations } from 'next-intl';
import { untilFetched } from '@/components/ui/until-fetched';
import type { TimeAxis } from '@/components/charts/time-axis';
import { treatmentAxis } from '@/components/charts/treatment-rows';
import { ticksOf } from '@/components/charts/value-axis';
import { AxisFigures, LaneName } from '@/components/week-sheet/lane-name';
import type { OpenSituation } from '@/lib/schemas/situation';
import { useHousehold } from './situation-context';
import { type TreatmentChart, treatmentPicture } from './treatment-picture';
import { useSituationFigures } from './use-situation-figures';
import { useTreatmentPhrases } from './use-treatment-phrases';

const LazyLane = dynamic(
  () => untilFetched(() => import('@/components/charts/treatment-lane')).then((part) => part.TreatmentLane),
  {
    ssr: false,
  },
);

/** The hour that is read, in the lanes below the chart. */
export const LazyTreatmentCursor = dynamic(
  () => untilFetched(() => import('@/components/charts/cursor-line')).then((part) => part.CursorLine),
  { ssr: false },
);

const HEIGHT = 268;
/** One cursor for all lanes. */
export const TREATMENT = 'situation';

type Props = { open: OpenSituation; chart: TreatmentChart; axis: TimeAxis; now: number; width: number };

/** Free chlorine since the procedure was opened. Nothing is drawn before the width of the plot [px] is known. */
export function TreatmentChlorine({ open, chart, axis, now, width }: Props) {
  const t = useTranslations('situations.chart');
  const { timeZone } = useHousehold();
  const units = useSituationFigures();
  const { maximum, swimLimit, lowestLevel } = chart;
  const picture = treatmentPicture(chart, open, axis, timeZone);
  const value = treatmentAxis(maximum, picture.points, picture.readings, HEIGHT);
  const phrases = useTreatmentPhrases(chart, picture, axis, now);
  const limits = [maximum, swimLimit];
  const figures = [...new Set([...ticksOf(value, 36), ...limits])].map((at) => ({
    at,
    words: units.number(at),
    limit: limits.includes(at),
  }));
  return (
    <div
      className="relative grid grid-cols-[var(--gutter)_minmax(0,1fr)] border-t border-rule-2"
      style={{ height: HEIGHT }}
    >
      <div className="sticky left-0 z-2 bg-paper">
        <div className="max-w-26">
          <LaneName name={t('name')} note={t('note', { unit: units.unitOf('freeChlorine') })} tone="teal" />
        </div>
        <AxisFigures value={value} figures={figures} />
      </div>
      <div className="min-w-0">
        {width > 0 && (
          <LazyLane
            {...picture}
            {...phrases}
            time={{ axis, width, nights: [], now, syncId: TREATMENT }}
            value={value}
            maximum={maximum}
            swimLimit={swimLimit}
            lowestLevel={lowestLevel}
          />
        )}
      </div>
    </div>
  );
}
