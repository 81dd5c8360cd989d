import { type PartOfDay, partOfDay } from '@/lib/calendar/part-of-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import type { WaterPoint } from '@/components/charts/water-curve';
import type { SheetDay } from './sheet-times';

export type Extreme = { value: number; part: PartOfDay };

/** Highest and lowest free chlorine of a day from 06:00 to midnight, as far as the curve reaches; undefined without one. */
export function highAndLowOf(
  day: SheetDay,
  points: readonly WaterPoint[],
  timeZone: string,
): { high: Extreme; low: Extreme } | undefined {
  const from = wallToInstant(day.day, '06:00', timeZone).instant;
  const within = points.filter(({ at }) => at >= from && at <= day.to);
  const [first] = within;
  if (first === undefined) return undefined;
  const middle = (point: WaterPoint) => point.freeChlorine.middle;
  const high = within.reduce((best, point) => (middle(point) > middle(best) ? point : best), first);
  const low = within.reduce((best, point) => (middle(point) < middle(best) ? point : best), first);
  // Midnight belongs to the night before it.
  const extreme = (point: WaterPoint): Extreme => ({
    value: middle(point),
    part: partOfDay(Math.min(point.at, day.to - 1), timeZone),
  });
  return { high: extreme(high), low: extreme(low) };
}
