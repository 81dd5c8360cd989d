const radians = Math.PI / 180;
const MILLISECONDS_PER_DAY = 86_400_000;
/** Noon of 1 January 2000 in Greenwich, from which the almanac counts its days. */
const EPOCH = Date.UTC(2000, 0, 1, 12);

/** Where the sun stands over the turning Earth [radians]. */
export type SolarPosition = {
  /** How far north of the equator it stands overhead. */
  declination: number;
  /** How far west of the Greenwich meridian; 0 at solar noon there, one turn a day. Between -pi and pi. */
  greenwichHourAngle: number;
};

/**
 * Declination and hour angle of the sun at an instant [ms since 1970-01-01T00:00Z].
 *
 * With n days from noon of 1 January 2000: L = 280.460 + 0.9856474 n, g = 357.528 + 0.9856003 n, ecliptic longitude
 * L + 1.915 sin g + 0.020 sin 2g, obliquity 23.439 - 4e-7 n, sidereal time 280.46062 + 360.98564737 n, all in degrees.
 *
 * Uncertainty: 0.01 degrees from 1950 to 2050. Refraction is not in it.
 * Source: Astronomical Almanac, low precision formulas for the Sun; Michalsky 1988, Solar Energy 40:227.
 */
export function solarPosition(instant: number): SolarPosition {
  const n = (instant - EPOCH) / MILLISECONDS_PER_DAY;
  const meanLongitude = (280.46 + 0.9856474 * n) * radians;
  const anomaly = (357.528 + 0.9856003 * n) * radians;
  const longitude = meanLongitude + (1.915 * Math.sin(anomaly) + 0.02 * Math.sin(2 * anomaly)) * radians;
  const obliquity = (23.439 - 4e-7 * n) * radians;
  const sine = Math.sin(longitude);
  const rightAscension = Math.atan2(Math.cos(obliquity) * sine, Math.cos(longitude));
  const siderealTime = (280.46062 + 360.98564737 * n) * radians;
  return {
    declination: Math.asin(Math.sin(obliquity) * sine),
    greenwichHourAngle: withinHalfTurn(siderealTime - rightAscension),
  };
}

function withinHalfTurn(angle: number): number {
  return angle - 2 * Math.PI * Math.round(angle / (2 * Math.PI));
}

/**
 * Sines of the sun's elevation at evenly spaced instants, for a model that asks hundreds of times a week:
 *
 *     sin e = sin(latitude) sin(declination) + cos(latitude) cos(declination) cos(hour angle)
 *
 * The position is worked out once a day and carried along a straight line in between: declination bends by less than
 * 0.001 degrees over a day, and the hour angle by less than that.
 *
 * @param from      first instant [ms]
 * @param spacing   between instants [ms]
 * @param latitude  degrees north
 * @param longitude degrees east
 * @returns one sine for each instant, negative when the sun is down. Refraction is not in it: it lifts the sun by half a
 *   degree at the horizon and by 0.03 degrees at 30, which moves the UV weight by less than 0.001
 */
export function sinesOfElevation(
  from: number,
  spacing: number,
  count: number,
  latitude: number,
  longitude: number,
): Float64Array {
  const sines = new Float64Array(count);
  const perDay = Math.max(1, Math.ceil(MILLISECONDS_PER_DAY / spacing));
  let today = solarPosition(from);
  for (let first = 0; first < count; first += perDay) {
    const next = solarPosition(from + (first + perDay) * spacing);
    const turns = (perDay * spacing) / MILLISECONDS_PER_DAY;
    const swing = next.greenwichHourAngle - today.greenwichHourAngle - 2 * Math.PI * turns;
    const perStep = (2 * Math.PI * turns + withinHalfTurn(swing)) / perDay;
    const north = Math.sin(latitude * radians) * Math.sin(today.declination);
    const northPerStep = (Math.sin(latitude * radians) * Math.sin(next.declination) - north) / perDay;
    const across = Math.cos(latitude * radians) * Math.cos(today.declination);
    const acrossPerStep = (Math.cos(latitude * radians) * Math.cos(next.declination) - across) / perDay;
    const hourAngle = today.greenwichHourAngle + longitude * radians;
    // A cosine of evenly spaced angles follows from the two before it: cos(a + b) = 2 cos(b) cos(a) - cos(a - b).
    const twiceTurn = 2 * Math.cos(perStep);
    let cosine = Math.cos(hourAngle);
    let cosineBefore = Math.cos(hourAngle - perStep);
    const last = Math.min(perDay, count - first);
    for (let step = 0; step < last; step++) {
      sines[first + step] = north + northPerStep * step + (across + acrossPerStep * step) * cosine;
      [cosine, cosineBefore] = [twiceTurn * cosine - cosineBefore, cosine];
    }
    today = next;
  }
  return sines;
}
