import { MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import type { PlannedDose } from '@/lib/schemas/dose';
import type { BrokenLimit, PlanProjection } from '@/lib/schemas/plan';
import { swimWaitHours } from '@/lib/standards/caps';
import { codeMinimum, limits } from '@/lib/standards/limits';
import type { PlanContext } from './context';
import type { LimitCode } from './codes';

type Test = {
  limit: LimitCode;
  unit: string;
  over: boolean;
  value: (hour: number) => number;
  bound: (hour: number) => number;
  in?: (hour: number) => boolean;
};

/** Which limits a projection breaks, each at the hour where it is broken by most, and by how much. */
export function brokenLimits(projection: PlanProjection, context: PlanContext, stabilized: boolean): BrokenLimit[] {
  const { freeChlorine, pH, cyanuricAcid } = projection;
  const tests: Test[] = [
    {
      limit: 'code-minimum',
      unit: 'mg/L',
      over: false,
      value: (hour) => freeChlorine.p10[hour]!,
      bound: (hour) => codeMinimum(cyanuricAcid.p50[hour]!, stabilized),
    },
    {
      limit: 'lowest-level',
      unit: 'mg/L',
      over: false,
      value: (hour) => freeChlorine.p50[hour]!,
      bound: (hour) => freeChlorine.lowestLevel[hour]!,
    },
    {
      limit: 'swim-limit',
      unit: 'mg/L',
      over: true,
      value: (hour) => freeChlorine.p50[hour]!,
      bound: (hour) => freeChlorine.swimLimit[hour]!,
      in: (hour) => context.swimHour[hour]!,
    },
    {
      limit: 'free-chlorine-maximum',
      unit: 'mg/L',
      over: true,
      value: (hour) => freeChlorine.p90[hour]!,
      bound: () => limits.freeChlorineMaximum.value,
    },
    { limit: 'pH-low', unit: 'pH', over: false, value: (hour) => pH.p50[hour]!, bound: () => limits.pHRangeLow.value },
    { limit: 'pH-high', unit: 'pH', over: true, value: (hour) => pH.p50[hour]!, bound: () => limits.pHRangeHigh.value },
  ];
  const broken = tests.flatMap((test) => worstOf(test, context) ?? []);
  const closes = stabilizerThatCloses(context);
  return closes ? [closes, ...broken] : broken;
}

function worstOf(
  { limit, unit, over, value, bound, in: applies }: Test,
  { hours }: PlanContext,
): BrokenLimit | undefined {
  let worst = 0;
  let found: BrokenLimit | undefined;
  hours.forEach((hour, index) => {
    if (applies && !applies(index)) return;
    const by = over ? value(index) - bound(index) : bound(index) - value(index);
    if (by <= worst) return;
    worst = by;
    found = { limit, at: new Date(hour).toISOString(), value: value(index), bound: bound(index), unit };
  });
  return found;
}

/** No chlorine level is both high and low enough: the stabilizer at which the gap would open again. */
function stabilizerThatCloses({ start, scenario, hours }: PlanContext): BrokenLimit | undefined {
  const { value: perLowestLevel } = limits.stabilizerPerLowestLevel;
  const bound = (scenario.pool.swimLimit - limits.swimLimitMargin.value) * perLowestLevel;
  const value = start.water.cyanuricAcid;
  if (value <= bound) return undefined;
  const limit: LimitCode = 'stabilizer-too-high-for-swim-limit';
  return { limit, at: new Date(hours[0]!).toISOString(), value, bound, unit: 'mg/L' };
}

/** Share of the plan's swim hours in which the median keeps all of the verdict's limits and no dose asks to wait. */
export function openSwimShare(
  projection: PlanProjection,
  doses: readonly PlannedDose[],
  { swimHour, hours }: Pick<PlanContext, 'swimHour' | 'hours'>,
): number {
  const { freeChlorine, pH } = projection;
  const waits = doses.map(({ at, substance }) => {
    const from = Date.parse(at);
    return { from, to: from + (swimWaitHours[substance] ?? 0) * MILLISECONDS_PER_HOUR };
  });
  let swim = 0;
  let open = 0;
  swimHour.forEach((swims, hour) => {
    if (!swims) return;
    swim++;
    const level = freeChlorine.p50[hour]!;
    const chlorineFits = level >= freeChlorine.lowestLevel[hour]! && level <= freeChlorine.swimLimit[hour]!;
    const pHFits = pH.p50[hour]! >= limits.pHRangeLow.value && pH.p50[hour]! <= limits.pHRangeHigh.value;
    const waiting = waits.some(({ from, to }) => hours[hour]! >= from && hours[hour]! < to);
    if (chlorineFits && pHFits && !waiting) open++;
  });
  return swim === 0 ? 1 : open / swim;
}
