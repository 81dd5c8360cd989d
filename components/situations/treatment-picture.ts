import { glyphOf } from '@/components/charts/chart-doses';
import type { TimeAxis } from '@/components/charts/time-axis';
import {
  type MorningBar,
  type TreatmentDose,
  type TreatmentPoint,
  treatmentPoints,
  type TreatmentReading,
} from '@/components/charts/treatment-rows';
import { wallToInstant } from '@/lib/calendar/wall-time';
import { productForms } from '@/lib/schemas/shelf-product';
import type { OpenSituation, Situations } from '@/lib/schemas/situation';
import { chlorines } from '@/lib/standards/chlorines';
import { instantOf } from './use-situation-times';

export type TreatmentChart = NonNullable<Situations['chart']>;

/** When a morning that is still to come is read. */
const MORNING = '08:00';

export type TreatmentPicture = {
  points: TreatmentPoint[];
  bars: MorningBar[];
  readings: TreatmentReading[];
  doses: TreatmentDose[];
};

/** What the chart draws of a procedure, on one axis. */
export function treatmentPicture(
  chart: TreatmentChart,
  { procedure }: OpenSituation,
  axis: TimeAxis,
  timeZone: string,
): TreatmentPicture {
  const doses = dosesOf(chart, procedure.steps);
  return {
    points: treatmentPoints(pointsOf(chart), doses, axis),
    bars: procedure.mornings.flatMap(({ day, takenAt, low, high }) =>
      low === null || high === null
        ? []
        : [{ at: takenAt === null ? wallToInstant(day, MORNING, timeZone).instant : instantOf(takenAt), low, high }],
    ),
    readings: chart.readings.map(({ takenAt, freeChlorine, inside }) => ({
      at: instantOf(takenAt),
      value: freeChlorine,
      inside,
    })),
    doses,
  };
}

/** The curve point by point; an hour that lacks a value is left out. */
export function pointsOf({ hours, p10, p50, p90 }: TreatmentChart): TreatmentPoint[] {
  return hours.flatMap((hour, index) => {
    const [low, middle, high] = [p10[index], p50[index], p90[index]];
    return low === undefined || middle === undefined || high === undefined
      ? []
      : [{ at: instantOf(hour), low, middle, high }];
  });
}

function dosesOf({ doses }: TreatmentChart, steps: OpenSituation['procedure']['steps']): TreatmentDose[] {
  return doses.flatMap(({ at, given }) => {
    const instant = instantOf(at);
    const step = steps.find(
      ({ kind, at: planned, doneAt }) =>
        kind === 'dose' && (instantOf(planned) === instant || (doneAt !== null && instantOf(doneAt) === instant)),
    );
    // Acid moves no chlorine.
    if (step && !chlorines.some((each) => each === step.figures.substance)) return [];
    const form = productForms.find((each) => each === step?.figures.form);
    return [{ at: instant, given, glyph: form && glyphOf(form) }];
  });
}
