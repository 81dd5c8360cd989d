import { AppError } from '@/lib/errors';

export type UnitSystem = 'us' | 'metric';

export type Dimension =
  | 'volume'
  | 'length'
  | 'area'
  | 'mass'
  | 'liquidVolume'
  | 'temperature'
  | 'concentration'
  | 'acidity'
  | 'pressure'
  | 'pricePerMass'
  | 'pricePerLiquidVolume';

type UnitDefinition = { dimension: Dimension; factor: number; zero?: number };

const LITRES_PER_US_GALLON = 3.785411784;
const METRES_PER_FOOT = 0.3048;
const KILOGRAMS_PER_POUND = 0.45359237;

/**
 * Every unit a household can meet: value inside = (value in the unit - zero) * factor. Inside are m3 for the pool, m, m2,
 * g, mL for what is poured, degrees C, mg/L, kPa, money per kg and per L.
 *
 * Factors are exact by definition: US gallon 231 in3, foot 0.3048 m, pound 0.45359237 kg, ounce a sixteenth of it, US
 * fluid ounce a 128th of the gallon (NIST Handbook 44, appendix C); the pound-force per square inch follows from them and
 * standard gravity. 1 ppm counts as 1 mg/L, as all pool tests do.
 */
const definitions = {
  m3: { dimension: 'volume', factor: 1 },
  L: { dimension: 'volume', factor: 0.001 },
  'us-gal': { dimension: 'volume', factor: LITRES_PER_US_GALLON / 1000 },
  m: { dimension: 'length', factor: 1 },
  cm: { dimension: 'length', factor: 0.01 },
  mm: { dimension: 'length', factor: 0.001 },
  ft: { dimension: 'length', factor: METRES_PER_FOOT },
  in: { dimension: 'length', factor: 0.0254 },
  m2: { dimension: 'area', factor: 1 },
  ft2: { dimension: 'area', factor: METRES_PER_FOOT * METRES_PER_FOOT },
  g: { dimension: 'mass', factor: 1 },
  kg: { dimension: 'mass', factor: 1000 },
  oz: { dimension: 'mass', factor: (KILOGRAMS_PER_POUND * 1000) / 16 },
  lb: { dimension: 'mass', factor: KILOGRAMS_PER_POUND * 1000 },
  mL: { dimension: 'liquidVolume', factor: 1 },
  'L-poured': { dimension: 'liquidVolume', factor: 1000 },
  'us-fl-oz': { dimension: 'liquidVolume', factor: (LITRES_PER_US_GALLON * 1000) / 128 },
  'us-gal-poured': { dimension: 'liquidVolume', factor: LITRES_PER_US_GALLON * 1000 },
  degC: { dimension: 'temperature', factor: 1 },
  degF: { dimension: 'temperature', factor: 5 / 9, zero: 32 },
  'mg/L': { dimension: 'concentration', factor: 1 },
  ppm: { dimension: 'concentration', factor: 1 },
  pH: { dimension: 'acidity', factor: 1 },
  kPa: { dimension: 'pressure', factor: 1 },
  bar: { dimension: 'pressure', factor: 100 },
  psi: { dimension: 'pressure', factor: (KILOGRAMS_PER_POUND * 9.80665) / 0.0254 ** 2 / 1000 },
  'per-kg': { dimension: 'pricePerMass', factor: 1 },
  'per-lb': { dimension: 'pricePerMass', factor: 1 / KILOGRAMS_PER_POUND },
  'per-L': { dimension: 'pricePerLiquidVolume', factor: 1 },
  'per-us-gal': { dimension: 'pricePerLiquidVolume', factor: 1 / LITRES_PER_US_GALLON },
} as const satisfies Record<string, UnitDefinition>;

export type UnitCode = keyof typeof definitions;
/** The units of one dimension. */
export type UnitOf<D extends Dimension> = {
  [Code in UnitCode]: (typeof definitions)[Code]['dimension'] extends D ? Code : never;
}[UnitCode];

export const unitCodes = Object.keys(definitions) as UnitCode[];

export function dimensionOf(unit: UnitCode): Dimension {
  return definitions[unit].dimension;
}

/** From a unit to the one used inside. */
export function toInside(value: number, unit: UnitCode): number {
  const { factor, zero = 0 }: UnitDefinition = definitions[unit];
  return (value - zero) * factor;
}

/** From the unit used inside to another; inverse of `toInside`. */
export function fromInside(value: number, unit: UnitCode): number {
  const { factor, zero = 0 }: UnitDefinition = definitions[unit];
  return value / factor + zero;
}

/** From one unit to another of the same dimension. Error: `invalid-input` when they measure different things. */
export function convert(value: number, from: UnitCode, to: UnitCode): number {
  if (dimensionOf(from) !== dimensionOf(to))
    throw new AppError('invalid-input', `${from} is no ${dimensionOf(to)} and cannot become ${to}.`);
  return fromInside(toInside(value, from), to);
}
