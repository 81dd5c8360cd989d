import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { WaterRangeError } from '@/lib/errors';
import { evaporationRate, latentHeat, openVesselRate, saturationPressure } from '@/lib/projection/evaporation';

const POUND = 0.45359237; // kg
const SQUARE_FOOT = 0.09290304; // m2
const INCH_OF_MERCURY = 3.386389; // kPa
const BTU_PER_POUND = 2.326; // kJ/kg
const FEET_PER_MINUTE = 0.00508; // m/s
const mild = { waterTemperature: 27, airTemperature: 25, relativeHumidity: 0.6, windSpeed: 0.5 };

describe('what evaporates', () => {
  /** As the source writes it, lb/h/ft2: W = (95 + 0.425 v) (pw - pa) / Y with v in ft/min, p in inHg, Y in Btu/lb. */
  const inPounds = (wind: number) =>
    (openVesselRate((1.032 - 0.5) * INCH_OF_MERCURY, wind * FEET_PER_MINUTE, 1048 * BTU_PER_POUND) *
      3600 *
      SQUARE_FOOT) /
    POUND;

  it('from an open vessel in still air is 0.0482 lb/h/ft2', () => {
    // tests/reference/published-values.csv, EVAP-W: pw 1.032, pa 0.500 inHg, Y 1048 Btu/lb, within 0.0005.
    expect(Math.abs(inPounds(0) - 0.0482)).toBeLessThan(0.0005);
  });

  it.each([0, 100, 500])('from an open vessel at %d ft/min follows the equation in its own units', (wind) => {
    expect(inPounds(wind) / (((95 + 0.425 * wind) * (1.032 - 0.5)) / 1048)).toBeCloseTo(1, 3);
  });

  it('from a quiet pool is 0.74 of that', () => {
    const { waterTemperature, airTemperature, relativeHumidity, windSpeed } = mild;
    const deficit = saturationPressure(waterTemperature) - relativeHumidity * saturationPressure(airTemperature);
    const vessel = openVesselRate(deficit, windSpeed, latentHeat(waterTemperature)) * 86_400;
    expect(evaporationRate(mild) / vessel).toBeCloseTo(0.74, 9);
  });

  it('from a quiet pool in that air is 0.165 inches a day', () => {
    // EVAP-IN: 0.165 in/day, within 0.01. 1.032 inHg is saturation at 80 F (26.7 degrees C), 0.500 that of half-moist air there.
    const perDay = evaporationRate({
      waterTemperature: 26.67,
      airTemperature: 26.67,
      relativeHumidity: 0.5 / 1.032,
      windSpeed: 0,
    });
    expect(Math.abs(perDay / 25.4 - 0.165)).toBeLessThan(0.01);
  });

  it('on a dry and breezy day lies in the published 0.25 to 0.5 inches', () => {
    // EVAP-DOE: US DOE, quoted by the City of Fort Worth, 2022.
    const perDay = evaporationRate({ waterTemperature: 28, airTemperature: 33, relativeHumidity: 0.4, windSpeed: 1.5 });
    expect(perDay / 25.4).toBeGreaterThan(0.25);
    expect(perDay / 25.4).toBeLessThan(0.5);
  });

  it('is 5 mm on a mild day, which is the default of a week', () => {
    expect(evaporationRate(mild)).toBeGreaterThan(4);
    expect(evaporationRate(mild)).toBeLessThan(6);
  });

  it.each([
    ['floating', 0.1],
    ['opaque', 0.05],
  ] as const)('under a cover (%s) is %d of that', (cover, share) => {
    expect(evaporationRate({ ...mild, cover }) / evaporationRate(mild)).toBeCloseTo(share, 12);
  });

  it('is nothing where the air is moister than the water', () => {
    expect(evaporationRate({ waterTemperature: 12, airTemperature: 30, relativeHumidity: 0.9, windSpeed: 2 })).toBe(0);
  });

  it('grows with warm water and wind, and falls with moist air', () => {
    const inputs = fc.record({
      waterTemperature: fc.double({ min: -2, max: 59, noNaN: true }),
      airTemperature: fc.double({ min: -40, max: 60, noNaN: true }),
      relativeHumidity: fc.double({ min: 0, max: 0.9, noNaN: true }),
      windSpeed: fc.double({ min: 0, max: 19, noNaN: true }),
    });
    fc.assert(
      fc.property(inputs, (air) => {
        const rate = evaporationRate(air);
        expect(Number.isFinite(rate) && rate >= 0).toBe(true);
        expect(evaporationRate({ ...air, waterTemperature: air.waterTemperature + 1 })).toBeGreaterThanOrEqual(rate);
        expect(evaporationRate({ ...air, windSpeed: air.windSpeed + 1 })).toBeGreaterThanOrEqual(rate);
        expect(evaporationRate({ ...air, relativeHumidity: air.relativeHumidity + 0.1 })).toBeLessThanOrEqual(rate);
      }),
    );
  });

  it.each(['waterTemperature', 'airTemperature', 'relativeHumidity', 'windSpeed'] as const)(
    'is refused outside the range of %s',
    (field) => {
      for (const value of [-50, 70, Number.NaN])
        expect(() => evaporationRate({ ...mild, [field]: value })).toThrow(WaterRangeError);
    },
  );
});

describe('water vapour', () => {
  it.each([
    // Saturation pressure over water [kPa], steam tables (IAPWS): 0, 20, 30, 40 degrees C.
    [0, 0.6112],
    [20, 2.3393],
    [30, 4.247],
    [40, 7.3849],
  ])('at %d degrees C is saturated at %d kPa', (celsius, pressure) => {
    expect(saturationPressure(celsius) / pressure).toBeCloseTo(1, 2);
  });

  it('takes 2,453 kJ/kg at 20 degrees C', () => {
    // FAO Irrigation and Drainage Paper 56: 2.45 MJ/kg at about 20 degrees C; steam tables 2,453.5.
    expect(Math.abs(latentHeat(20) - 2453.5)).toBeLessThan(1);
  });
});
