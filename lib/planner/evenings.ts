import { addDays, dayOf, type CalendarDay } from '@/lib/calendar/household-day';
import { wallToInstant } from '@/lib/calendar/wall-time';
import { MILLISECONDS_PER_HOUR, HOURS_IN_PLAN } from '@/lib/projection/forcing';
import type { Pool } from '@/lib/schemas/pool';
import { daylightOf } from '@/lib/sun/daylight';

const QUARTER_HOUR = MILLISECONDS_PER_HOUR / 4;
const BEFORE_SUNSET = MILLISECONDS_PER_HOUR;

/** An evening on which something may go in. */
export type Evening = { day: CalendarDay; at: number; afterDark: boolean };

/**
 * The dose hour of each day of the plan: 60 minutes before sunset rounded to a quarter hour, and never before the last
 * swim hour is over (nothing goes in while somebody may swim). Where the sun does not set, the end of the swim hours.
 *
 * @param takenAt first instant of the plan [ms]
 * @param now     nothing is planned before it [ms]
 */
export function doseEvenings(pool: Pool, takenAt: number, now: number): Evening[] {
  const endsAt = takenAt + HOURS_IN_PLAN * MILLISECONDS_PER_HOUR;
  const evenings: Evening[] = [];
  for (let day = dayOf(takenAt, pool.timeZone); evenings.length < 8; day = addDays(day, 1)) {
    const { at, sunset } = doseHour(pool, day);
    if (at >= endsAt) break;
    if (at >= now && at >= takenAt) evenings.push({ day, at, afterDark: sunset !== null && at > sunset });
  }
  return evenings;
}

function doseHour(pool: Pool, day: CalendarDay): { at: number; sunset: number | null } {
  const noon = wallToInstant(day, '12:00', pool.timeZone).instant;
  const { sunset } = daylightOf(noon, pool.latitude, pool.longitude);
  const swimEnd = wallToInstant(day, pool.swimHours.to, pool.timeZone).instant;
  if (sunset === null) return { at: swimEnd, sunset };
  const lastLight = Math.round((sunset - BEFORE_SUNSET) / QUARTER_HOUR) * QUARTER_HOUR;
  const swimStart = wallToInstant(day, pool.swimHours.from, pool.timeZone).instant;
  const swimming = lastLight >= swimStart && lastLight < swimEnd;
  return { at: swimming ? swimEnd : lastLight, sunset };
}
