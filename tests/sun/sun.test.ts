import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { daylightOf } from '@/lib/sun/daylight';
import { solarElevation, solarElevations } from '@/lib/sun/elevation';
import { ultravioletWeight } from '@/lib/sun/ultraviolet';

// The UV index rows of tests/reference/published-values.csv are checked in tests/chemistry/published-values.test.ts.

const at = (text: string) => Date.parse(text);
const MINUTE = 60_000;

describe('elevation of the sun', () => {
  it('worked example of the NREL solar position algorithm', () => {
    // Reda & Andreas 2004, NREL/TP-560-34302, table A5.1: topocentric zenith angle 50.11162 degrees (with the thin air
    // of 1830 m, so our sea-level refraction lifts the sun 0.004 degrees more).
    const elevation = solarElevation(at('2003-10-17T12:30:30-07:00'), 39.742476, -105.1786);
    expect(Math.abs(elevation - (90 - 50.11162))).toBeLessThan(0.02);
  });

  it('stands at 66.4 degrees on a summer noon at 47 degrees north, where the photolysis rates were measured', () => {
    const day = Array.from({ length: 24 * 12 }, (_, step) => at('2026-06-21T00:00Z') + step * 5 * MINUTE);
    expect(Math.max(...solarElevations(day, 47, 8))).toBeCloseTo(66.4, 1);
  });

  it('gives one elevation per instant, whatever the machine thinks the time zone is', () => {
    const instants = [at('2026-07-05T12:00-04:00'), at('2026-07-06T00:00-04:00')];
    const elevations = solarElevations(instants, 28, -81.5);
    expect(elevations).toEqual(instants.map((instant) => solarElevation(instant, 28, -81.5)));
    expect(elevations[0]).toBeGreaterThan(65);
    expect(elevations[1]).toBeLessThan(-30);
  });
});

describe('sunrise and sunset', () => {
  it('worked example of the NREL solar position algorithm', () => {
    // Reda & Andreas 2004, table A5.1: 17 October 2003, sunrise 06:12:43, sunset 17:20:19 local time (UTC-7). Its day is
    // that of Greenwich, where the sun of this place sets at 00:20: the sunset is the one of the evening before.
    const { sunrise } = daylightOf(at('2003-10-17T12:00-07:00'), 39.742476, -105.1786);
    expect(Math.abs(sunrise! - at('2003-10-17T06:12:43-07:00'))).toBeLessThan(MINUTE / 6);
    const { sunset } = daylightOf(at('2003-10-16T12:00-07:00'), 39.742476, -105.1786);
    expect(Math.abs(sunset! - at('2003-10-16T17:20:19-07:00'))).toBeLessThan(MINUTE / 6);
  });

  it.each([
    // Almanac values as printed by observatories, rounded to the minute.
    ['London, June solstice', '2024-06-20T12:00+01:00', 51.5074, -0.1278, '04:43', '21:21'],
    ['New York, June solstice', '2024-06-20T12:00-04:00', 40.7128, -74.006, '05:25', '20:30'],
    ['Sydney, December solstice', '2024-12-21T12:00+11:00', -33.8688, 151.2093, '05:41', '20:05'],
  ])('%s', (_, noon, latitude, longitude, sunrise, sunset) => {
    const found = daylightOf(at(noon), latitude, longitude);
    const wall = (time: string) => at(`${noon.slice(0, 11)}${time}${noon.slice(16)}`);
    expect(Math.abs(found.sunrise! - wall(sunrise))).toBeLessThanOrEqual(2 * MINUTE);
    expect(Math.abs(found.sunset! - wall(sunset))).toBeLessThanOrEqual(2 * MINUTE);
  });

  it("belongs to the household's own day where its clock is far from the sun", () => {
    // Kiritimati: UTC+14 at 157 degrees west, so noon there is the evening before in Greenwich.
    const { sunrise, sunset } = daylightOf(at('2026-07-05T12:00+14:00'), 1.87, -157.4);
    expect(sunrise).toBeGreaterThan(at('2026-07-05T00:00+14:00'));
    expect(sunset).toBeLessThan(at('2026-07-06T00:00+14:00'));
    expect(sunset! - sunrise!).toBeGreaterThan(11.5 * 60 * MINUTE);
  });

  it('says which of the two never comes', () => {
    expect(daylightOf(at('2026-06-21T12:00+02:00'), 69.65, 18.96)).toEqual({
      sunrise: null,
      sunset: null,
      polar: 'day',
    });
    expect(daylightOf(at('2026-12-21T12:00+01:00'), 69.65, 18.96)).toEqual({
      sunrise: null,
      sunset: null,
      polar: 'night',
    });
  });

  it('frames the time when the sun is up', () => {
    fc.assert(
      fc.property(
        fc.integer({ min: at('2020-01-01T00:00Z'), max: at('2040-01-01T00:00Z') }),
        fc.integer({ min: -60, max: 60 }),
        fc.integer({ min: -179, max: 179 }),
        (instant, latitude, longitude) => {
          const solarNoon = Math.floor(instant / 86_400_000) * 86_400_000 + (12 - longitude / 15) * 3_600_000;
          const { sunrise, sunset } = daylightOf(solarNoon, latitude, longitude);
          expect(sunrise).toBeLessThan(solarNoon);
          expect(sunset).toBeGreaterThan(solarNoon);
          const edges = solarElevations([sunrise!, sunset!], latitude, longitude);
          // Centre 0.833 degrees under the horizon, lifted by about half a degree of refraction.
          for (const edge of edges) expect(Math.abs(edge + 0.35)).toBeLessThan(0.05);
          expect(solarElevation(solarNoon, latitude, longitude)).toBeGreaterThan(5);
          expect(solarElevation(sunset! + 10 * MINUTE, latitude, longitude)).toBeLessThan(0);
        },
      ),
    );
  });
});

describe('UV weight', () => {
  it('is 1 at the reference sun, 0 when the sun is down, 1.24 overhead', () => {
    expect(ultravioletWeight(66.4)).toBe(1);
    expect(ultravioletWeight(0)).toBe(0);
    expect(ultravioletWeight(-30)).toBe(0);
    expect(ultravioletWeight(90)).toBeCloseTo(1.2354, 4);
  });

  it('falls with the cosine of the zenith angle to the power 2.42', () => {
    // Madronich 2007: 12.5 overhead, 2.34 at 60 degrees from the zenith.
    expect(ultravioletWeight(30) / ultravioletWeight(90)).toBeCloseTo(2.34 / 12.5, 3);
  });
});
