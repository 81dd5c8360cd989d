import * as PlainDateTime from 'temporal-polyfill/fns/PlainDateTime';
import { AppError } from '@/lib/errors';
import { addDays, type CalendarDay, startOfDay } from './household-day';
import { epochDayOf } from './epoch-day';
import { isTimeZone, zoneStretch } from './zone-offset';

export { isTimeZone };

/** What the clock on the wall shows, "19:40", 00:00 to 23:59. */
export type WallTime = string;
/** Local clock times, `to` excluded; may cross midnight; `to` equal to `from` is a whole day round. */
export type WallInterval = { from: WallTime; to: WallTime };
/** Instants [ms], `to` excluded. */
export type InstantInterval = { from: number; to: number };

const wallShape = /^([01]\d|2[0-3]):([0-5]\d)$/;

/**
 * The instant [ms] of a planned day and wall time. A time that the clocks skip is moved on by the length of the gap; of a
 * time that comes twice the first one counts; both are told by `exact: false`.
 *
 * Errors: `invalid-input` for what is no day, no time of day or no zone.
 */
export function wallToInstant(day: CalendarDay, time: WallTime, timeZone: string): { instant: number; exact: boolean } {
  const { earlier, later, compatible } = readings(day, time, timeZone);
  return { instant: compatible, exact: earlier === later };
}

/** What calendar and clock show at an instant; `hourOfDay` with its fraction, seconds included. */
export function wallClock(
  instant: number,
  timeZone: string,
): { day: CalendarDay; hour: number; minute: number; hourOfDay: number } {
  const local = new Date(instant + zoneStretch(instant, timeZone).offset);
  const hour = local.getUTCHours();
  const minute = local.getUTCMinutes();
  const seconds = local.getUTCSeconds() + local.getUTCMilliseconds() / 1000;
  return { day: local.toISOString().slice(0, 10), hour, minute, hourOfDay: hour + minute / 60 + seconds / 3600 };
}

/** "19:40" at an instant. */
export function wallTimeOf(instant: number, timeZone: string): WallTime {
  const { hour, minute } = wallClock(instant, timeZone);
  return `${twoDigits(hour)}:${twoDigits(minute)}`;
}

/** An instant with the household's offset, "2026-07-05T19:00:00-04:00"; whole seconds. */
export function toOffsetIso(instant: number, timeZone: string): string {
  const { offset } = zoneStretch(instant, timeZone);
  const minutes = Math.round(Math.abs(offset) / 60_000);
  const sign = offset < 0 ? '-' : '+';
  const clock = new Date(instant + offset).toISOString().slice(0, 19);
  return `${clock}${sign}${twoDigits(Math.floor(minutes / 60))}:${twoDigits(minutes % 60)}`;
}

const isoInstant =
  /^(\d{4}-\d{2}-\d{2})T([01]\d|2[0-3]):[0-5]\d(:[0-5]\d(\.\d{1,9})?)?(Z|[+-]([01]\d|2[0-3]):[0-5]\d)$/;

/** Milliseconds since 1970 of an ISO instant with `Z` or an offset; undefined for anything else, a bare day included. */
export function parseInstant(iso: string): number | undefined {
  const day = isoInstant.exec(iso)?.[1];
  if (day === undefined) return undefined;
  try {
    epochDayOf(day);
  } catch {
    return undefined;
  }
  return Date.parse(iso);
}

/**
 * The stretches of a household day in which one of its daily wall-clock intervals runs: in order, joined where they touch,
 * cut at the day's ends, so that the stretches of several days put together lose and double nothing. The tail of an
 * interval that crossed last midnight belongs to this day.
 *
 * Where clocks go forward a skipped time counts as the moment of the change; where they go back an interval begins at the
 * first of the two readings and ends at the second, so it is never shorter than its clock times.
 *
 * Errors: `invalid-input` for what is no day, no time of day or no zone.
 */
export function intervalsOfDay(
  intervals: readonly WallInterval[],
  day: CalendarDay,
  timeZone: string,
): InstantInterval[] {
  const bounds = { from: startOfDay(day, timeZone), to: startOfDay(addDays(day, 1), timeZone) };
  const pieces = [addDays(day, -1), day]
    .flatMap((start) => intervals.map((interval) => instantsOf(interval, start, timeZone)))
    .map(({ from, to }) => ({ from: Math.max(from, bounds.from), to: Math.min(to, bounds.to) }))
    .filter(({ from, to }) => from < to)
    .sort((a, b) => a.from - b.from);
  const joined: InstantInterval[] = [];
  for (const piece of pieces) {
    const last = joined.at(-1);
    if (last && piece.from <= last.to) last.to = Math.max(last.to, piece.to);
    else joined.push(piece);
  }
  return joined;
}

function instantsOf({ from, to }: WallInterval, day: CalendarDay, timeZone: string): InstantInterval {
  const lastDay = to > from ? day : addDays(day, 1);
  const start = readings(day, from, timeZone);
  const end = readings(lastDay, to, timeZone);
  return { from: start.gap ?? start.earlier, to: end.gap ?? end.later };
}

/** Every way to read a wall time of a day: `gap` is the moment of the change when the clocks skip it. */
function readings(day: CalendarDay, time: WallTime, timeZone: string) {
  const [, hour, minute] = wallShape.exec(time) ?? [];
  if (hour === undefined || minute === undefined)
    throw new AppError('invalid-input', `"${time}" is not a time of day like 19:40.`);
  if (!isTimeZone(timeZone))
    throw new AppError('invalid-input', `"${timeZone}" is not a time zone this machine knows.`);
  epochDayOf(day);
  const [year, month, date] = day.split('-').map(Number) as [number, number, number];
  const plain = PlainDateTime.create(year, month, date, Number(hour), Number(minute));
  const read = (disambiguation: 'earlier' | 'later' | 'compatible') =>
    PlainDateTime.toZonedDateTime(plain, timeZone, { disambiguation }).epochMilliseconds;
  const earlier = read('earlier');
  const later = read('later');
  const skipped = earlier !== later && wallTimeOf(earlier, timeZone) !== time;
  const gap = skipped ? zoneStretch(earlier, timeZone).until : undefined;
  return { earlier, later, compatible: read('compatible'), gap };
}

function twoDigits(value: number): string {
  return String(value).padStart(2, '0');
}
