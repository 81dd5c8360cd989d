import { wallTimeText } from '@/lib/calendar/format';
import type { WallTime } from '@/lib/calendar/wall-time';

/** Hours with their fraction, 0 to 24, as a wall time; 24 is the next midnight, which the clock shows as 00:00. */
export function wallTimeOfHour(hour: number): WallTime {
  const minutes = Math.round(hour * 60) % 1440;
  const two = (value: number) => `${value}`.padStart(2, '0');
  return `${two(Math.floor(minutes / 60))}:${two(minutes % 60)}`;
}

/** Inverse; `asEnd` reads 00:00 as the end of the day. */
export function hourOfWallTime(time: WallTime, asEnd = false): number {
  const minutes = (Date.parse(`1970-01-01T${time}:00Z`) / 60_000) % 1440;
  return minutes === 0 && asEnd ? 24 : minutes / 60;
}

export function hourText(hour: number, locale: string): string {
  return wallTimeText(wallTimeOfHour(hour), locale);
}
