import 'server-only';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { PlannedDose } from '@/lib/schemas/dose';
import { swimWaitHours } from '@/lib/standards/caps';
import { limits } from '@/lib/standards/limits';

const HOUR = 3_600_000;
/** Where the table names none: as long as the longest of the others. */
const usualWait = 4;

const moves = {
  chlorine: ['calcium-hypochlorite', 'sodium-hypochlorite', 'dichlor'],
  acid: ['hydrochloric-acid', 'sodium-bisulfate'],
} as const satisfies Record<string, readonly string[]>;

/**
 * Until when nobody swims after a dose [ms]: the least time of the table, and for chlorine until the middle of the likely
 * range is at or under the swim limit, for acid until pH is back in range. Where the plan does not see that happen, its end.
 *
 * @param at when it went in, or is to go in [ms]
 */
export function swimWaitUntil(
  { substance }: Pick<PlannedDose, 'substance'>,
  at: number,
  plan: Pick<WeekPlan, 'hours' | 'projection'> | null,
): number {
  const least = at + (swimWaitHours[substance] ?? usualWait) * HOUR;
  const projection = plan?.projection;
  const end = Date.parse(plan?.hours.at(-1) ?? '');
  if (!projection || !(least <= end)) return least;
  const isOpen = openAt(substance, projection);
  const before = plan.hours.findLastIndex((hour) => Date.parse(hour) <= least);
  if (isOpen(before) && isOpen(Math.min(before + 1, plan.hours.length - 1))) return least;
  const open = plan.hours.findIndex((hour, index) => Date.parse(hour) >= least && isOpen(index));
  return open < 0 ? end : Date.parse(plan.hours[open] ?? '');
}

function openAt(
  substance: string,
  { freeChlorine, pH }: NonNullable<WeekPlan['projection']>,
): (hour: number) => boolean {
  if (includes(moves.chlorine, substance))
    return (hour) => (freeChlorine.p50[hour] ?? 0) <= (freeChlorine.swimLimit[hour] ?? 0);
  if (includes(moves.acid, substance)) {
    const inRange = (value: number) => value >= limits.pHRangeLow.value && value <= limits.pHRangeHigh.value;
    return (hour) => inRange(pH.p50[hour] ?? Number.NaN);
  }
  return () => true;
}

function includes(list: readonly string[], substance: string): boolean {
  return list.includes(substance);
}
