import { AppError } from '@/lib/errors';
import { type Dimension, dimensionOf, type UnitCode, type UnitOf, type UnitSystem } from './unit';

/** How one unit of a quantity is written: `keep` leaves the zeros standing, so that 3 reads "3.0". */
export type Writing = { unit: UnitCode; decimals: number; keep?: true };

/** Small amounts in the first writing, from its `below` on in the next. */
type Ladder = readonly (Writing & { below?: number })[];
type QuantityDefinition = { dimension: Dimension; metric: Ladder; us: Ladder };

const concentration = (decimals: number) =>
  ({
    dimension: 'concentration',
    metric: [{ unit: 'mg/L', decimals, keep: true }],
    us: [{ unit: 'ppm', decimals, keep: true }],
  }) as const satisfies QuantityDefinition;

/**
 * What the product measures, and how much of each value is said: one decimal for chlorine and pH, none for stabilizer,
 * hardness and alkalinity, because the tests tell no more than that.
 */
const definitions = {
  freeChlorine: concentration(1),
  combinedChlorine: concentration(1),
  totalAlkalinity: concentration(0),
  calciumHardness: concentration(0),
  cyanuricAcid: concentration(0),
  dissolvedSolids: concentration(0),
  pH: {
    dimension: 'acidity',
    metric: [{ unit: 'pH', decimals: 1, keep: true }],
    us: [{ unit: 'pH', decimals: 1, keep: true }],
  },
  temperature: {
    dimension: 'temperature',
    metric: [{ unit: 'degC', decimals: 0 }],
    us: [{ unit: 'degF', decimals: 0 }],
  },
  /** Water in the pool, replaced, lost. */
  volume: {
    dimension: 'volume',
    metric: [
      { unit: 'L', decimals: 0, below: 1000 },
      { unit: 'm3', decimals: 1 },
    ],
    us: [{ unit: 'us-gal', decimals: 0 }],
  },
  length: {
    dimension: 'length',
    metric: [{ unit: 'm', decimals: 2 }],
    us: [{ unit: 'ft', decimals: 1 }],
  },
  /** How far the water stands or falls. */
  level: {
    dimension: 'length',
    metric: [{ unit: 'cm', decimals: 0 }],
    us: [{ unit: 'in', decimals: 0 }],
  },
  rain: {
    dimension: 'length',
    metric: [{ unit: 'mm', decimals: 0 }],
    us: [{ unit: 'in', decimals: 1 }],
  },
  area: {
    dimension: 'area',
    metric: [{ unit: 'm2', decimals: 0 }],
    us: [{ unit: 'ft2', decimals: 0 }],
  },
  /** A dry product. */
  mass: {
    dimension: 'mass',
    metric: [
      { unit: 'g', decimals: 0, below: 1000 },
      { unit: 'kg', decimals: 2 },
    ],
    us: [
      { unit: 'oz', decimals: 1, below: 16 },
      { unit: 'lb', decimals: 2 },
    ],
  },
  /** A liquid product. */
  liquidVolume: {
    dimension: 'liquidVolume',
    metric: [
      { unit: 'mL', decimals: 0, below: 1000 },
      { unit: 'L-poured', decimals: 2 },
    ],
    us: [
      { unit: 'us-fl-oz', decimals: 1, below: 128 },
      { unit: 'us-gal-poured', decimals: 2 },
    ],
  },
  pressure: {
    dimension: 'pressure',
    metric: [{ unit: 'bar', decimals: 2 }],
    us: [{ unit: 'psi', decimals: 0 }],
  },
  pricePerMass: {
    dimension: 'pricePerMass',
    metric: [{ unit: 'per-kg', decimals: 2, keep: true }],
    us: [{ unit: 'per-lb', decimals: 2, keep: true }],
  },
  pricePerLiquidVolume: {
    dimension: 'pricePerLiquidVolume',
    metric: [{ unit: 'per-L', decimals: 2, keep: true }],
    us: [{ unit: 'per-us-gal', decimals: 2, keep: true }],
  },
} as const satisfies Record<string, QuantityDefinition>;

export type Quantity = keyof typeof definitions;
export type UnitOfQuantity<Q extends Quantity> = UnitOf<(typeof definitions)[Q]['dimension']>;

export const quantities = Object.keys(definitions) as Quantity[];

/** Error: `invalid-input` when a unit measures something else; typed code cannot, data from outside can. */
export function assertUnitOf(quantity: Quantity, unit: UnitCode): void {
  if (dimensionOf(unit) !== definitions[quantity].dimension)
    throw new AppError('invalid-input', `${quantity} is not measured in ${unit}.`);
}

/** From the smallest unit of a quantity in a system of units to its largest. */
export function ladderOf(quantity: Quantity, system: UnitSystem): Ladder {
  return definitions[quantity][system];
}
