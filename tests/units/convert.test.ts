import { readFileSync } from 'node:fs';
import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { convert, dimensionOf, fromInside, toInside, type UnitCode, unitCodes } from '@/lib/units/unit';

describe('published conversions', () => {
  // NIST Handbook 44 (appendix C) and NIST SP 811 (appendix B), as printed there.
  it.each<[number, UnitCode, number, UnitCode, number]>([
    [1, 'us-gal', 3.785411784, 'L', 1e-12],
    [1, 'ft', 0.3048, 'm', 1e-15],
    [1, 'in', 2.54, 'cm', 1e-12],
    [1, 'ft2', 0.09290304, 'm2', 1e-15],
    [1, 'oz', 28.349523125, 'g', 1e-12],
    [1, 'lb', 453.59237, 'g', 1e-12],
    [16, 'oz', 1, 'lb', 1e-12],
    [1, 'us-fl-oz', 29.5735295625, 'mL', 1e-12],
    [128, 'us-fl-oz', 1, 'us-gal-poured', 1e-12],
    [1, 'psi', 6.894757, 'kPa', 1e-6],
    [1, 'bar', 14.5038, 'psi', 1e-4],
    [212, 'degF', 100, 'degC', 1e-12],
    [32, 'degF', 0, 'degC', 1e-15],
    [-40, 'degF', -40, 'degC', 1e-12],
    [98.6, 'degF', 37, 'degC', 1e-12],
    [1, 'ppm', 1, 'mg/L', 0],
    [7.5, 'per-kg', 3.401942775, 'per-lb', 1e-9],
    [1.6, 'per-L', 6.0566588544, 'per-us-gal', 1e-9],
  ])('%d %s is %d %s', (value, from, expected, to, tolerance) => {
    expect(Math.abs(convert(value, from, to) - expected)).toBeLessThanOrEqual(tolerance);
    expect(Math.abs(convert(expected, to, from) - value)).toBeLessThanOrEqual(Math.max(1e-12, tolerance * 5));
  });

  it('agrees with the volume rows of published-values.csv', () => {
    const rows = readFileSync('tests/reference/published-values.csv', 'utf8').split('\n');
    const published = (id: string) => {
      const row = rows.find((line) => line.startsWith(`${id},`))?.split(',') ?? [];
      return { expected: Number(row[3]), tolerance: Number(row[5]) };
    };
    const litres = published('VOL-L');
    expect(Math.abs(convert(1, 'us-gal', 'L') - litres.expected)).toBeLessThanOrEqual(litres.tolerance);
    const perCubicFoot = published('VOL-GALFT3');
    const cubicFoot = toInside(1, 'ft') ** 3;
    expect(Math.abs(fromInside(cubicFoot, 'us-gal') - perCubicFoot.expected)).toBeLessThanOrEqual(
      perCubicFoot.tolerance,
    );
  });
});

describe('every unit', () => {
  const value = fc.double({ min: -1e6, max: 1e6, noNaN: true });
  it('comes back as it went in', () => {
    fc.assert(
      fc.property(value, fc.constantFrom(...unitCodes), (amount, unit) => {
        expect(Math.abs(fromInside(toInside(amount, unit), unit) - amount)).toBeLessThanOrEqual(1e-9);
      }),
    );
  });
  it('converts only within its dimension, and keeps the order of values', () => {
    fc.assert(
      fc.property(
        value,
        value,
        fc.constantFrom(...unitCodes),
        fc.constantFrom(...unitCodes),
        (smaller, larger, from, to) => {
          if (dimensionOf(from) !== dimensionOf(to)) expect(() => convert(smaller, from, to)).toThrow('cannot become');
          else if (smaller < larger) expect(convert(smaller, from, to)).toBeLessThanOrEqual(convert(larger, from, to));
        },
      ),
    );
  });
});
