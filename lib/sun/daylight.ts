import { getTimes } from 'suncalc';

/** Sunrise and sunset [ms], or which of the two never comes on this day. */
export type Daylight =
  { sunrise: number; sunset: number; polar: null } | { sunrise: null; sunset: null; polar: 'day' | 'night' };

/**
 * When the sun's upper edge crosses the horizon (centre 0.833 degrees below it) on a household's calendar day.
 * Within a minute of the NREL solar position algorithm at middle latitudes; hills and weather are not known.
 *
 * @param localNoon noon of that day on the household's clock [ms]: the day is the solar day that holds this instant
 * @param latitude  degrees north
 * @param longitude degrees east
 */
export function daylightOf(localNoon: number, latitude: number, longitude: number): Daylight {
  const times = getTimes(new Date(localNoon), latitude, longitude);
  if (times.sunrise === null || times.sunset === null) {
    return { sunrise: null, sunset: null, polar: times.alwaysUp === true ? 'day' : 'night' };
  }
  return { sunrise: times.sunrise.getTime(), sunset: times.sunset.getTime(), polar: null };
}
