import { AppError } from '@/lib/errors';
import { type CalendarDay, epochDayOf, MILLISECONDS_PER_DAY } from './epoch-day';
import { startOfEpochDay } from './household-day';
import { type LocalReading, readLocalTime } from './local-time';
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
  const { earlier, later, gap } = readingOf(epochDayOf(day), time, timeZone);
  return { instant: gap === undefined ? earlier : later, exact: earlier === later };
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
  return intervalsOfEpochDay(intervals, epochDayOf(day), timeZone);
}

/** The same for a day given by its number, see `epochDayOf`. */
export function intervalsOfEpochDay(
  intervals: readonly WallInterval[],
  epochDay: number,
  timeZone: string,
): InstantInterval[] {
  const [dayFrom, dayTo] = [startOfEpochDay(epochDay, timeZone), startOfEpochDay(epochDay + 1, timeZone)];
  const pieces: InstantInterval[] = [];
  for (let start = epochDay - 1; start <= epochDay; start++) {
    for (const interval of intervals) {
      const { from, to } = instantsOf(interval, start, timeZone);
      if (from < dayTo && to > dayFrom) pieces.push({ from: Math.max(from, dayFrom), to: Math.min(to, dayTo) });
    }
  }
  return joined(pieces);
}

/** The same stretches of time without overlaps, in order; those that touch become one. */
export function joined(intervals: readonly InstantInterval[]): InstantInterval[] {
  const whole: InstantInterval[] = [];
  for (const { from, to } of [...intervals].sort((a, b) => a.from - b.from)) {
    const last = whole.at(-1);
    if (last && from <= last.to) last.to = Math.max(last.to, to);
    else whole.push({ from, to });
  }
  return whole;
}

function instantsOf({ from, to }: WallInterval, epochDay: number, timeZone: string): InstantInterval {
  const start = readingOf(epochDay, from, timeZone);
  const end = readingOf(to > from ? epochDay : epochDay + 1, to, timeZone);
  return { from: start.gap ?? start.earlier, to: end.gap ?? end.later };
}

function readingOf(epochDay: number, time: WallTime, timeZone: string): LocalReading {
  const [, hour, minute] = wallShape.exec(time) ?? [];
  if (hour === undefined || minute === undefined)
    throw new AppError('invalid-input', `"${time}" is not a time of day like 19:40.`);
  return readLocalTime(epochDay * MILLISECONDS_PER_DAY + (Number(hour) * 60 + Number(minute)) * 60_000, timeZone);
}

function twoDigits(value: number): string {
  return String(value).padStart(2, '0');
}
