import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { formatForInput, formatNumber, formatQuantity, formatQuantityIn } from '@/lib/units/format';
import { parseDecimal, parseQuantity } from '@/lib/units/parse';
import { ladderOf, quantities, type Quantity } from '@/lib/units/quantity';

const locales = ['en-US', 'en-GB', 'de-DE', 'fr-CH', 'sv-SE', 'ar-EG', 'hi-IN', 'pl-PL'];
const anyLocale = fc.constantFrom(...locales);

describe('text to number', () => {
  it.each([
    ['3.5', 3.5],
    ['3,5', 3.5],
    [' 3,5 ', 3.5],
    ['\u00a07.4\t', 7.4],
    ['-2', -2],
    ['\u22122,5', -2.5],
    ['.5', 0.5],
    [',5', 0.5],
    ['0', 0],
    ['007', 7],
    // One sign is a decimal sign, whatever it may have meant.
    ['1.234', 1.234],
    ['1,234', 1.234],
    ['18000', 18000],
  ])('"%s" is %d', (text, value) => expect(parseDecimal(text)).toBe(value));

  it.each([
    '1,234.5',
    '1.234,5',
    '1,234,567',
    '1 234',
    '1\u00a0234',
    "1'234",
    '3.',
    '.',
    '',
    '   ',
    '-',
    '+3',
    '3 mg/L',
    '1e3',
    '0x10',
    'NaN',
    'Infinity',
    '--1',
    '3-4',
    '٣',
    '9'.repeat(400),
  ])('"%s" is no number', (text) => expect(parseDecimal(text)).toBeUndefined());

  it('never gives -0', () => {
    for (const text of ['-0', '-0.0', '\u22120,00']) expect(Object.is(parseDecimal(text), 0)).toBe(true);
  });

  it('answers any text with a finite number or nothing', () => {
    fc.assert(
      fc.property(fc.string({ unit: fc.constantFrom(...'0123456789.,-\u2212+ eE\u00a0') }), (text) => {
        const value = parseDecimal(text);
        if (value !== undefined) expect(Number.isFinite(value)).toBe(true);
      }),
    );
  });

  it('turns what was typed in a unit into the value inside', () => {
    expect(parseQuantity('20000', 'volume', 'us-gal')).toBeCloseTo(75.70823568, 10);
    expect(parseQuantity('84', 'temperature', 'degF')).toBeCloseTo(28.8889, 4);
    expect(parseQuantity('3,2', 'freeChlorine', 'ppm')).toBe(3.2);
    expect(parseQuantity('12 lb', 'mass', 'lb')).toBeUndefined();
  });

  it('refuses a unit of something else, as data from outside could ask for', () => {
    const unit = JSON.parse('"kg"') as 'm3';
    expect(() => parseQuantity('1', 'volume', unit)).toThrow('volume is not measured in kg');
    expect(() => formatForInput(1, 'volume', unit, 'en-US')).toThrow('volume is not measured in kg');
    expect(() => formatQuantityIn(1, 'volume', unit, 'en-US')).toThrow('volume is not measured in kg');
  });
});

describe('number to text', () => {
  it('writes the locale decimal sign, no groups, no -0', () => {
    expect(formatNumber(1234567.25, { decimals: 1, locale: 'en-US' })).toBe('1234567.3');
    expect(formatNumber(1234567.25, { decimals: 1, locale: 'de-DE' })).toBe('1234567,3');
    expect(formatNumber(3, { decimals: 1, locale: 'en-GB' })).toBe('3.0');
    expect(formatNumber(-0.04, { decimals: 1, locale: 'en-GB' })).toBe('0.0');
    expect(formatNumber(-0, { decimals: 0, locale: 'en-GB' })).toBe('0');
    expect(formatNumber(-0.06, { decimals: 1, locale: 'en-GB' })).toBe('-0.1');
    expect(formatNumber(7.5, { decimals: 1, locale: 'ar-EG' }).replace('\u066b', '.')).toBe('7.5');
  });

  it('refuses what is no number', () => {
    for (const value of [Number.NaN, Infinity, -Infinity]) {
      expect(() => formatNumber(value, { decimals: 1, locale: 'en-US' })).toThrow('cannot be written');
      expect(() => formatQuantity(value, 'volume', 'us', 'en-US')).toThrow();
    }
  });

  it.each<[number, Quantity, string, string, string, string]>([
    // One decimal for chlorine and pH, none for stabilizer and hardness (visual language, annotation rule 4).
    [3, 'freeChlorine', '3.0', 'mg/L', '3.0', 'ppm'],
    [0.2, 'combinedChlorine', '0.2', 'mg/L', '0.2', 'ppm'],
    [7.46, 'pH', '7.5', 'pH', '7.5', 'pH'],
    [44.4, 'cyanuricAcid', '44', 'mg/L', '44', 'ppm'],
    [219.5, 'calciumHardness', '220', 'mg/L', '220', 'ppm'],
    [80.2, 'totalAlkalinity', '80', 'mg/L', '80', 'ppm'],
    [29, 'temperature', '29', 'degC', '84', 'degF'],
    [75.70823568, 'volume', '75.7', 'm3', '20000', 'us-gal'],
    [68, 'volume', '68', 'm3', '17964', 'us-gal'],
    [0.64, 'volume', '640', 'L', '169', 'us-gal'],
    [1.36, 'length', '1.36', 'm', '4.5', 'ft'],
    [0.15, 'level', '15', 'cm', '6', 'in'],
    [0.012, 'rain', '12', 'mm', '0.5', 'in'],
    [50, 'area', '50', 'm2', '538', 'ft2'],
    // Grams below a kilogram, ounces below a pound.
    [95, 'mass', '95', 'g', '3.4', 'oz'],
    [999.4, 'mass', '999', 'g', '2.2', 'lb'],
    [999.6, 'mass', '1', 'kg', '2.2', 'lb'],
    [1250, 'mass', '1.25', 'kg', '2.76', 'lb'],
    [453.5, 'mass', '454', 'g', '1', 'lb'],
    [450, 'mass', '450', 'g', '15.9', 'oz'],
    [750, 'liquidVolume', '750', 'mL', '25.4', 'us-fl-oz'],
    [2500, 'liquidVolume', '2.5', 'L-poured', '84.5', 'us-fl-oz'],
    [3785.4, 'liquidVolume', '3.79', 'L-poured', '1', 'us-gal-poured'],
    [69, 'pressure', '0.69', 'bar', '10', 'psi'],
    [7.5, 'pricePerMass', '7.50', 'per-kg', '3.40', 'per-lb'],
    [1.6, 'pricePerLiquidVolume', '1.60', 'per-L', '6.06', 'per-us-gal'],
  ])('%d of %s', (value, quantity, metric, metricUnit, us, usUnit) => {
    expect(formatQuantity(value, quantity, 'metric', 'en-GB')).toEqual({ value: metric, unitCode: metricUnit });
    expect(formatQuantity(value, quantity, 'us', 'en-US')).toEqual({ value: us, unitCode: usUnit });
  });

  it('writes a decimal comma where it is at home', () => {
    expect(formatQuantity(1250, 'mass', 'metric', 'de-DE').value).toBe('1,25');
    expect(formatQuantity(3, 'freeChlorine', 'metric', 'de-DE').value).toBe('3,0');
  });

  it('keeps to one asked unit', () => {
    expect(formatQuantityIn(1250, 'mass', 'g', 'en-GB')).toEqual({ value: '1250', unitCode: 'g' });
    expect(formatQuantityIn(50, 'mass', 'kg', 'en-GB')).toEqual({ value: '0.05', unitCode: 'kg' });
    expect(formatQuantityIn(10, 'pressure', 'kPa', 'en-GB')).toEqual({ value: '10', unitCode: 'kPa' });
  });
});

describe('there and back', () => {
  it('reads what it wrote, in any locale', () => {
    const decimals = fc.integer({ min: 0, max: 4 });
    fc.assert(
      fc.property(fc.double({ min: -1e6, max: 1e6, noNaN: true }), decimals, anyLocale, (value, places, locale) => {
        // Arabic writes its own decimal sign and marks the direction of a minus: not a text anybody types here.
        fc.pre(locale !== 'ar-EG');
        const text = formatNumber(value, { decimals: places, locale });
        const back = parseDecimal(text);
        expect(back).toBeDefined();
        expect(Object.is(back, -0)).toBe(false);
        expect(text).not.toMatch(/^[-\u2212]0(?:[.,]0*)?$/);
        expect(Math.abs((back as number) - value)).toBeLessThanOrEqual(0.5000001 * 10 ** -places);
      }),
      { numRuns: 500 },
    );
  });

  it('gives a field back what was typed into it, in every unit of every quantity', () => {
    const typed = fc.integer({ min: 0, max: 9_999_999 }).map((value) => value / 100);
    const written = quantities.flatMap((quantity) =>
      (['metric', 'us'] as const).flatMap((system) =>
        ladderOf(quantity, system).map(({ unit }) => ({ quantity, unit })),
      ),
    );
    fc.assert(
      fc.property(
        typed,
        fc.constantFrom(...written),
        fc.constantFrom('en-US', 'de-DE'),
        (value, { quantity, unit }, locale) => {
          const text = locale === 'de-DE' ? String(value).replace('.', ',') : String(value);
          const inside = parseQuantity(text, quantity, unit as never);
          expect(formatForInput(inside as number, quantity, unit as never, locale)).toBe(text);
        },
      ),
      { numRuns: 1000 },
    );
  });

  it('keeps the typed gallons through the cubic metres inside', () => {
    expect(formatForInput(68.137412112, 'volume', 'us-gal', 'en-US')).toBe('18000');
  });
});
