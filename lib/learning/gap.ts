import { addDays, daysBetween, dayOf } from '@/lib/calendar/household-day';
import { type Forcing, MILLISECONDS_PER_HOUR, prepareForcing } from '@/lib/projection/forcing';
import { type WeekAhead, weekAheadSchema } from '@/lib/schemas/week-ahead';
import type { DayConditions, PoolHistory } from './history';

/**
 * Three hours: over a week free chlorine stays within 0.03 mg/L of that by steps of one hour (tested), far below what any
 * test can tell, at a quarter of the time.
 */
const STEPS_PER_HOUR = 1 / 3;

const usual = weekAheadSchema.parse({});

/**
 * What acted on the water between two instants [ms], by what was written down of each day. Water temperature that nobody
 * wrote down runs straight from the one reading's to the other's.
 */
export function forcingBetween(
  { pool, days }: Pick<PoolHistory, 'pool' | 'days'>,
  from: number,
  to: number,
  temperatures: { first: number; last: number },
): Forcing {
  const first = dayOf(from, pool.timeZone);
  const count = daysBetween(first, dayOf(to, pool.timeZone)) + 1;
  const conditions = Array.from({ length: count }, (_, index): DayConditions => days[addDays(first, index)] ?? {});
  const each = (name: Exclude<keyof WeekAhead, 'waterTemperature'>) =>
    conditions.map((day) => day[name] ?? usual[name][0]!);
  const between = (index: number) =>
    temperatures.first + ((temperatures.last - temperatures.first) * (index + 0.5)) / count;
  const week: WeekAhead = {
    sky: each('sky'),
    rain: each('rain'),
    swimmerHours: each('swimmerHours'),
    evaporation: each('evaporation'),
    backwash: each('backwash'),
    waterTemperature: conditions.map(({ waterTemperature }, index) => waterTemperature ?? between(index)),
  };
  const hours = (to - from) / MILLISECONDS_PER_HOUR;
  const forcing = prepareForcing(pool, from, week, temperatures.first, { stepsPerHour: STEPS_PER_HOUR, hours });
  // Only the end of the gap is asked for: a course that takes the whole of it for one hour keeps no others.
  return { ...forcing, stepsPerHour: forcing.steps };
}
