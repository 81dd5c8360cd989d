import { toOffsetIso } from '@/lib/calendar/wall-time';
import type { WeekPlan } from '@/lib/schemas/plan';
import type { Scenario } from '@/lib/schemas/scenario';
import type { PlanContext } from './context';
import { ENGINE_VERSION } from './version';

/** What every plan says of itself: the engine that made it, the reading it starts at, its hours. */
export function frame({ start, hours, scenario }: PlanContext) {
  return {
    engineVersion: ENGINE_VERSION,
    takenAt: toOffsetIso(start.takenAt, scenario.pool.timeZone),
    hours: hours.map((hour) => new Date(hour).toISOString()),
  };
}

/** A plan that cannot be made: it only says what it lacks. */
export function planWithout(scenario: Scenario, needs: WeekPlan['needs']): WeekPlan {
  const newest = [scenario.reading].flat().reduce((a, b) => (Date.parse(b.takenAt) > Date.parse(a.takenAt) ? b : a));
  return {
    engineVersion: ENGINE_VERSION,
    takenAt: newest.takenAt,
    hours: [],
    projection: null,
    doses: [],
    checks: [],
    endOfWeek: null,
    cost: null,
    mix: null,
    alternatives: [],
    openSwimShare: null,
    broken: [],
    reasons: [],
    cautions: [],
    needs,
  };
}
