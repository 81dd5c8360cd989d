import * as ZonedDateTime from 'temporal-polyfill/fns/ZonedDateTime';
import { AppError } from '@/lib/errors';

/** A stretch of time in which a zone's clocks do not change: `from` included, `until` excluded. All milliseconds. */
export type ZoneStretch = { from: number; until: number; offset: number };

const known = new Map<string, ZoneStretch[]>();

/**
 * The stretch of constant offset that holds an instant, so that a day or a clock reading is an addition afterwards.
 * Stretches are kept: a week of hourly steps asks the zone's rules once or twice, not 168 times.
 *
 * @param instant  milliseconds since 1970-01-01T00:00Z
 * @param timeZone IANA name, e.g. "Europe/Madrid"
 * Errors: `invalid-input` for an unknown zone or an instant that is not a finite number in the range of `Date`.
 * Source: the zone rules of the runtime (IANA), through temporal-polyfill.
 */
export function zoneStretch(instant: number, timeZone: string): ZoneStretch {
  const stretches = known.get(timeZone) ?? [];
  for (const stretch of stretches) if (instant >= stretch.from && instant < stretch.until) return stretch;
  const found = lookUp(instant, timeZone);
  // The latest answer stands first: the next question is nearly always about the same weeks.
  known.set(timeZone, [found, ...stretches]);
  return found;
}

function lookUp(instant: number, timeZone: string): ZoneStretch {
  if (!(Math.abs(instant) <= 8.64e15)) throw new AppError('invalid-input', `${instant} is not an instant.`);
  if (!isTimeZone(timeZone))
    throw new AppError('invalid-input', `"${timeZone}" is not a time zone this machine knows.`);
  // One nanosecond past the instant, or a change that falls exactly on it would not count as a previous one.
  const moment = ZonedDateTime.create(BigInt(Math.floor(instant)) * 1_000_000n + 1n, timeZone);
  return {
    from: ZonedDateTime.getTimeZoneTransition(moment, 'previous')?.epochMilliseconds ?? -Infinity,
    until: ZonedDateTime.getTimeZoneTransition(moment, 'next')?.epochMilliseconds ?? Infinity,
    offset: ZonedDateTime.offsetNanoseconds(moment) / 1e6,
  };
}

/** Whether this is the name of an IANA zone. A bare offset is none: it knows no summer time. */
export function isTimeZone(name: string): boolean {
  if (!/^[A-Za-z]/.test(name)) return false;
  try {
    ZonedDateTime.create(0n, name);
    return true;
  } catch {
    return false;
  }
}
