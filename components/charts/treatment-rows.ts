import { valueAxis, type ValueAxis } from './value-axis';
import { withJumps } from './water-curve';

/** Free chlorine at one instant: 8 times in 10 the true value lies between `low` and `high`. */
export type TreatmentPoint = { at: number; low: number; middle: number; high: number };

/** One instant of the chart; the likely range is filled from now on. */
export type TreatmentRow = { at: number; behind?: TreatmentPoint; ahead?: TreatmentPoint };

/** What a clear pool would have kept overnight. */
export type MorningBar = { at: number; low: number; high: number };
export type TreatmentReading = { at: number; value: number; inside: boolean | null };
export type TreatmentDose = { at: number; given: boolean; glyph: 'tablet' | 'granules' | 'liquid' | undefined };

/** The curve with each jump at its dose, cut to the axis. */
export function treatmentPoints(
  points: readonly TreatmentPoint[],
  doses: readonly TreatmentDose[],
  { from, to }: { from: number; to: number },
): TreatmentPoint[] {
  const jumped = withJumps(
    points,
    doses.map(({ at }) => at),
  );
  return jumped.filter(({ at }) => at >= from && at <= to);
}

/** Rows that meet at the first point from now on. */
export function treatmentRows(points: readonly TreatmentPoint[], now: number): TreatmentRow[] {
  const turn = points.findIndex(({ at }) => at >= now);
  return points.map((point, index) => ({
    at: point.at,
    ...(turn === -1 || index <= turn ? { behind: point } : {}),
    ...(turn !== -1 && index >= turn ? { ahead: point } : {}),
  }));
}

/** From 0 to 10, or as far up as the readings ask for; room above for the words of now. */
export function treatmentAxis(
  maximum: number,
  points: readonly TreatmentPoint[],
  readings: readonly TreatmentReading[],
  height: number,
): ValueAxis {
  const highest = Math.max(maximum, ...points.map(({ high }) => high), ...readings.map(({ value }) => value));
  return valueAxis({ low: 0, high: Math.ceil(highest), height, above: 42, below: 8 });
}

/** The middle at the foot of a dose's jump; undefined outside the curve. */
export function treatmentFoot(points: readonly TreatmentPoint[], at: number): number | undefined {
  const exact = points.find((point) => point.at === at);
  if (exact) return exact.middle;
  const index = points.findLastIndex((point) => point.at <= at);
  const [before, after] = [points[index], points[index + 1]];
  if (before === undefined || after === undefined) return undefined;
  return before.middle + ((at - before.at) / (after.at - before.at)) * (after.middle - before.middle);
}
