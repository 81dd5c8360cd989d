import 'server-only';
import type { WeekDayRow } from '@/db/queries/week-days';
import { addDays, type CalendarDay, startOfDay } from '@/lib/calendar/household-day';
import { toOffsetIso, wallToInstant } from '@/lib/calendar/wall-time';
import type { Pool } from '@/lib/schemas/pool';
import { weekAheadSchema } from '@/lib/schemas/week-ahead';
import type { WeekSheet } from '@/lib/schemas/week-sheet';
import { daylightOf } from '@/lib/sun/daylight';
import { solarElevations } from '@/lib/sun/elevation';
import { ultravioletWeight } from '@/lib/sun/ultraviolet';

const HOUR = 3_600_000;
const samplesPerHour = 4;

type SheetDay = WeekSheet['days'][number];

/** The days of a sheet with their sun, as the projection reckons it, and what was said of them. */
export function sheetDays(days: readonly CalendarDay[], rows: readonly WeekDayRow[], pool: Pool): SheetDay[] {
  const usualSky = weekAheadSchema.parse({}).sky[0] ?? 0;
  return days.map((day) => {
    const row = rows.find((known) => known.day === day);
    const { timeZone, latitude, longitude } = pool;
    const iso = (instant: number | null) => (instant === null ? null : toOffsetIso(instant, timeZone));
    const startsAt = startOfDay(day, timeZone);
    const endsAt = startOfDay(addDays(day, 1), timeZone);
    const noon = wallToInstant(day, '12:00', timeZone).instant;
    const { sunrise, sunset } = daylightOf(noon, latitude, longitude);
    return {
      day,
      startsAt: toOffsetIso(startsAt, timeZone),
      endsAt: toOffsetIso(endsAt, timeZone),
      sunrise: iso(sunrise),
      sunset: iso(sunset),
      sun: sunOf(startsAt, endsAt, pool).map((share) => share * (row?.sky ?? usualSky) * pool.sunExposure),
      rain: row?.rainMillimetres ?? 0,
      swimmerHours: row?.swimmerHours ?? 0,
    };
  });
}

/** UV under a clear sky for each hour from a day's start, share of the reference sun: the mean of four moments. */
function sunOf(startsAt: number, endsAt: number, { latitude, longitude }: Pool): number[] {
  return Array.from({ length: Math.ceil((endsAt - startsAt) / HOUR) }, (_, hour) => {
    const moments = Array.from(
      { length: samplesPerHour },
      (_sample, sample) => startsAt + (hour + (sample + 0.5) / samplesPerHour) * HOUR,
    );
    const weights = solarElevations(moments, latitude, longitude).map(ultravioletWeight);
    return weights.reduce((sum, weight) => sum + weight, 0) / samplesPerHour;
  });
}
