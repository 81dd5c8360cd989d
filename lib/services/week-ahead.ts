import 'server-only';
import type { WeekDayRow, WeekDayValues } from '@/db/queries/week-days';
import { addDays, type CalendarDay } from '@/lib/calendar/household-day';
import { DAYS_OF_A_PLAN, type WeekAhead, weekAheadSchema } from '@/lib/schemas/week-ahead';

/** What was said of the days of a plan, in the engine's arrays; the usual where nothing was said. */
export function weekAheadOf(rows: readonly WeekDayRow[], first: CalendarDay): WeekAhead {
  const usual = weekAheadSchema.parse({});
  const byDay = new Map(rows.map((row) => [row.day, row]));
  const days = Array.from({ length: DAYS_OF_A_PLAN }, (_, index) => byDay.get(addDays(first, index)));
  const each = (quantity: keyof WeekDayValues, otherwise: number) => days.map((day) => day?.[quantity] ?? otherwise);
  const week: WeekAhead = {
    sky: each('sky', usual.sky[0] ?? 0),
    rain: each('rainMillimetres', 0),
    swimmerHours: each('swimmerHours', 0),
    evaporation: each('evaporationMillimetres', usual.evaporation[0] ?? 0),
    backwash: each('backwashCubicMetres', 0),
  };
  const temperature = days.find((day) => typeof day?.waterTemperature === 'number')?.waterTemperature;
  return typeof temperature === 'number' ? { ...week, waterTemperature: lasting(days, temperature) } : week;
}

/** A day without a temperature has that of the day before it; those before the first known one have the first. */
function lasting(days: readonly (WeekDayRow | undefined)[], first: number): number[] {
  let last = first;
  return days.map((day) => (last = day?.waterTemperature ?? last));
}
