import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { daylightOf } from '@/lib/sun/daylight';
import { solarElevation, solarElevations } from '@/lib/sun/elevation';
import { sinesOfElevation, solarPosition } from '@/lib/sun/solar-position';
import { skyOfSunshine } from '@/lib/sun/sunshine';
import { ultravioletWeight, ultravioletWeightOfSine } from '@/lib/sun/ultraviolet';

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

describe('position of the sun over the turning Earth', () => {
  it.each([
    // Meeus 1998, Astronomical Algorithms, example 25.a: apparent declination -7.78507 degrees.
    ['1992-10-13T00:00Z', -7.785],
    // Reda & Andreas 2004, NREL/TP-560-34302, table A5.1: geocentric declination -9.31434 degrees.
    ['2003-10-17T19:30:30Z', -9.314],
  ])('%s: declination %d degrees', (instant, declination) => {
    expect(Math.abs((solarPosition(at(instant)).declination * 180) / Math.PI - declination)).toBeLessThan(0.01);
  });

  it('hour angle of the worked example of the NREL solar position algorithm', () => {
    // Table A5.1: local hour angle 11.105900 degrees at 105.1786 degrees west.
    const { greenwichHourAngle } = solarPosition(at('2003-10-17T19:30:30Z'));
    expect(Math.abs((greenwichHourAngle * 180) / Math.PI - 105.1786 - 11.1059)).toBeLessThan(0.01);
  });

  it.each([2001, 2026, 2049])(
    'gives the UV weight of the fuller algorithm within 0.001, every quarter of an hour, %d',
    (year) => {
      const quarter = 15 * MINUTE;
      let worst = 0;
      for (const latitude of [-66, -35, 0, 28, 51.5, 69.6, 90])
        for (let day = 0; day < 365; day += 28) {
          const longitude = ((day * 47) % 360) - 180;
          const from = Date.UTC(year, 0, 1 + day) + (day % 96) * quarter;
          const instants = Array.from({ length: 7 * 96 }, (_, index) => from + index * quarter);
          const sines = sinesOfElevation(from, quarter, instants.length, latitude, longitude);
          solarElevations(instants, latitude, longitude).forEach((elevation, index) => {
            const difference = ultravioletWeightOfSine(sines[index]!) - ultravioletWeight(elevation);
            worst = Math.max(worst, Math.abs(difference));
          });
        }
      expect(worst).toBeLessThan(0.001);
    },
  );

  it('takes any spacing and any length', () => {
    const from = at('2026-07-05T19:07Z');
    const fine = sinesOfElevation(from, 7 * MINUTE, 400, 28, -81.5);
    const coarse = sinesOfElevation(from, 21 * MINUTE, 134, 28, -81.5);
    expect(Array.from(coarse)).toEqual(Array.from(coarse, (_, index) => expect.closeTo(fine[3 * index]!, 5) as number));
    expect(sinesOfElevation(from, 7 * MINUTE, 1, 28, -81.5)).toHaveLength(1);
    expect(sinesOfElevation(from, 3 * 24 * 60 * MINUTE, 3, 28, -81.5)[2]).toBeCloseTo(
      sinesOfElevation(from + 6 * 24 * 60 * MINUTE, MINUTE, 1, 28, -81.5)[0]!,
      9,
    );
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

describe('the sky of a day with so much sunshine', () => {
  // FAO Irrigation and Drainage Paper 56, equations 35 and 36: Rs = (0.25 + 0.50 n/N) Ra, clear sky 0.75 Ra.
  it.each([
    [0, 15, 1 / 3],
    [7.5, 15, 2 / 3],
    [15, 15, 1],
    [24, 15, 1],
    [-1, 15, 1 / 3],
    [9, 12, 0.625 / 0.75],
  ])('%f h of %f h give %f of a clear one', (sunshine, dayLength, share) =>
    expect(skyOfSunshine(sunshine, dayLength)).toBeCloseTo(share, 12),
  );
});
