import 'server-only';
import type { WeekDayValues } from '@/db/queries/week-days';
import { epochDayOf } from '@/lib/calendar/epoch-day';
import { type CalendarDay, weekday } from '@/lib/calendar/household-day';
import { chanceOf, normalOf } from './demo-chance';

const daysInAYear = 365.2425;
/** The warmest water comes in the middle of February. */
const warmestDay = 45;
const showersOnOneDayIn = 5;

/** Sky, rain, water temperature and swimmers of a day; the same for the same day, whenever it is asked. */
export function demoDay(
  day: CalendarDay,
): Required<Pick<WeekDayValues, 'sky' | 'rainMillimetres' | 'swimmerHours' | 'waterTemperature'>> {
  const epochDay = epochDayOf(day);
  const showers = chanceOf('showers', epochDay) < 1 / showersOnOneDayIn;
  const season = Math.cos((2 * Math.PI * (epochDay - warmestDay)) / daysInAYear);
  return {
    sky: tenths(showers ? 0.45 + 0.2 * chanceOf('cloud', epochDay) : 0.8 + 0.15 * chanceOf('cloud', epochDay)),
    rainMillimetres: showers ? Math.round(1 + 6 * chanceOf('rain', epochDay)) : 0,
    swimmerHours: swimmersOn(day, epochDay),
    waterTemperature: tenths(25.5 + 2.5 * season + 0.4 * normalOf('warmth', epochDay)),
  };
}

function swimmersOn(day: CalendarDay, epochDay: number): number {
  const isWeekend = weekday(day) >= 6;
  const usual = isWeekend ? 5 : 1;
  return usual + Math.floor(chanceOf('swimmers', epochDay) * (isWeekend ? 5 : 3));
}

function tenths(value: number): number {
  return Math.round(value * 10) / 10;
}
