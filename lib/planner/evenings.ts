import { addDays, dayOf, startOfDay, type CalendarDay } from '@/lib/calendar/household-day';
import { intervalsOfDay, wallToInstant } from '@/lib/calendar/wall-time';
import type { WeekDose } from '@/lib/projection/events';
import { MILLISECONDS_PER_HOUR, HOURS_IN_PLAN } from '@/lib/projection/forcing';
import type { Pool } from '@/lib/schemas/pool';
import { limits } from '@/lib/standards/limits';
import { daylightOf } from '@/lib/sun/daylight';
import type { PlanContext } from './context';

const QUARTER_HOUR = MILLISECONDS_PER_HOUR / 4;
const LAST_LIGHT_BEFORE_SUNSET = MILLISECONDS_PER_HOUR;
const SWIM_WAIT = limits.swimAfterDose.value * MILLISECONDS_PER_HOUR;
/** Nobody is asked to wait longer than this for the last swimmer. */
const LONGEST_WAIT = 12 * MILLISECONDS_PER_HOUR;

/** An evening on which something may go in. */
export type Evening = { day: CalendarDay; at: number; afterDark: boolean };

/**
 * The dose hour of each day of the plan: 60 minutes before sunset rounded to a quarter hour; where that falls into the swim
 * hours or less than the waiting time before them, a quarter hour after they end: nothing goes in while somebody may swim.
 * Where the sun does not set, noon takes the place of that hour. A day on which swimming never stops has none.
 *
 * @param takenAt first instant of the plan [ms]
 * @param now     nothing is planned before it [ms]
 */
export function doseEvenings(pool: Pool, takenAt: number, now: number): Evening[] {
  const endsAt = takenAt + HOURS_IN_PLAN * MILLISECONDS_PER_HOUR;
  const evenings: Evening[] = [];
  for (let day = dayOf(takenAt, pool.timeZone); startOfDay(day, pool.timeZone) < endsAt; day = addDays(day, 1)) {
    const hour = doseHour(pool, day);
    if (hour && hour.at < endsAt && hour.at >= now && hour.at >= takenAt) evenings.push({ day, ...hour });
  }
  return evenings;
}

/**
 * The evenings that a plan may use: none while the likely range is over 10 mg/L by itself, none on a day on which chlorine
 * was given, none within the gap between acid and chlorine of anything given, none on a day that the household keeps free.
 */
export function openEvenings({ scenario, start, now, given, wishes, belowMaximumFrom }: PlanContext): Evening[] {
  const { pool } = scenario;
  const gap = limits.acidToChlorineGap.value * MILLISECONDS_PER_HOUR;
  const chlorineDays = new Set(given.filter(bringsChlorine).map(({ at }) => dayOf(at, pool.timeZone)));
  return doseEvenings(pool, start.takenAt, now).filter(
    ({ at }) =>
      at >= belowMaximumFrom &&
      // A late evening may lie behind midnight.
      !chlorineDays.has(dayOf(at, pool.timeZone)) &&
      !wishes.notOn.includes(dayOf(at, pool.timeZone)) &&
      given.every((dose) => Math.abs(dose.at - at) >= gap),
  );
}

/** Whether something goes in within the last two hours of light; where the sun does not set there is no such hour. */
export function isLastLight(at: number, { latitude, longitude }: Pick<Pool, 'latitude' | 'longitude'>): boolean {
  const { sunset } = daylightOf(at, latitude, longitude);
  return sunset !== null && at <= sunset && at >= sunset - 2 * MILLISECONDS_PER_HOUR;
}

function bringsChlorine(dose: WeekDose): boolean {
  return dose.kind === 'tablets' || dose.contents.freeChlorine > 0;
}

function doseHour(pool: Pool, day: CalendarDay): Omit<Evening, 'day'> | undefined {
  const noon = wallToInstant(day, '12:00', pool.timeZone).instant;
  const { sunset } = daylightOf(noon, pool.latitude, pool.longitude);
  const lastLight =
    sunset === null ? noon : Math.round((sunset - LAST_LIGHT_BEFORE_SUNSET) / QUARTER_HOUR) * QUARTER_HOUR;
  const swimming = [addDays(day, -1), day, addDays(day, 1)].flatMap((each) =>
    intervalsOfDay([pool.swimHours], each, pool.timeZone),
  );
  let at = lastLight;
  for (const { from, to } of swimming) if (at > from - SWIM_WAIT && at <= to) at = to + QUARTER_HOUR;
  if (at - lastLight > LONGEST_WAIT) return undefined;
  return { at, afterDark: sunset !== null && at > sunset };
}
