import { parseInstant } from '@/lib/calendar/wall-time';
import { HOURS_IN_PLAN, MILLISECONDS_PER_HOUR } from '@/lib/projection/forcing';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import { limits } from '@/lib/standards/limits';
import type { NeedCode } from './codes';

type Need = WeekPlan['needs'][number];
const MILLISECONDS_PER_DAY = 86_400_000;

/** What must be measured before there can be a plan, or for a better one. */
export function needsOf(scenario: Scenario): { blocking: Need[]; wanted: Need[] } {
  const readings = [scenario.reading].flat();
  const newest = (quantity: 'freeChlorine' | 'pH' | 'cyanuricAcid' | 'calciumHardness') =>
    readings
      .filter((reading) => reading[quantity] !== undefined)
      .map(({ takenAt }) => takenAt)
      .sort((a, b) => parseInstant(b)! - parseInstant(a)!)[0];
  const last = Math.max(...readings.map(({ takenAt }) => parseInstant(takenAt)!));
  const now = scenario.now === undefined ? last : Math.max(last, parseInstant(scenario.now)!);
  const blocking = (['freeChlorine', 'pH'] as const).flatMap((quantity): Need[] => {
    const since = newest(quantity);
    if (since === undefined) return [{ code: 'never-measured' satisfies NeedCode, quantity, since: null }];
    const days = (now - parseInstant(since)!) / MILLISECONDS_PER_DAY;
    return days > limits.planReadingAge.value ? [{ code: 'reading-too-old' satisfies NeedCode, quantity, since }] : [];
  });
  const wanted: Need[] = [];
  if (newest('cyanuricAcid') === undefined)
    wanted.push({ code: 'never-measured' satisfies NeedCode, quantity: 'cyanuricAcid', since: null });
  for (const quantity of ['cyanuricAcid', 'calciumHardness'] as const) {
    const since = newest(quantity);
    if (since !== undefined && now - parseInstant(since)! > limits.monthlyTest.value * MILLISECONDS_PER_DAY)
      wanted.push({ code: 'measured-long-ago' satisfies NeedCode, quantity, since });
  }
  // The week of the newest reading is over: there is no evening left to plan.
  if (blocking.length === 0 && now >= last + HOURS_IN_PLAN * MILLISECONDS_PER_HOUR)
    wanted.push({
      code: 'reading-too-old' satisfies NeedCode,
      quantity: 'freeChlorine',
      since: newest('freeChlorine') ?? null,
    });
  return { blocking, wanted };
}
