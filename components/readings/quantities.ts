import { measuredRange } from '@/lib/schemas/measured-range';
import type { UnitSystem } from '@/lib/units/unit';

/** What a test asks for. Total chlorine is asked because strips and kits show it; used-up chlorine is worked out. */
export const entryQuantities = [
  'totalChlorine',
  'freeChlorine',
  'pH',
  'totalAlkalinity',
  'cyanuricAcid',
  'calciumHardness',
  'temperature',
] as const;
export type EntryQuantity = (typeof entryQuantities)[number];

/** What a strip has pads for. */
export const padQuantities = [
  'totalChlorine',
  'freeChlorine',
  'pH',
  'totalAlkalinity',
  'cyanuricAcid',
  'calciumHardness',
] as const;
export type PadQuantity = (typeof padQuantities)[number];

/** The order in which a kit or a slip is gone through; a quick check ends after the second. */
export const typedQuantities = [
  'freeChlorine',
  'pH',
  'totalChlorine',
  'totalAlkalinity',
  'calciumHardness',
  'cyanuricAcid',
  'temperature',
] as const satisfies readonly EntryQuantity[];

export const quickQuantities: readonly EntryQuantity[] = ['freeChlorine', 'pH'];

type Range = readonly [low: number, high: number];

/** What the water model permits; total chlorine holds free and used-up chlorine. mg/L, pH, degrees C. */
export function permitted(quantity: EntryQuantity): Range {
  if (quantity !== 'totalChlorine') return measuredRange[quantity];
  return [0, measuredRange.freeChlorine[1] + measuredRange.combinedChlorine[1]];
}

/**
 * Where nearly every reading of a garden pool lies. Our own bounds, for questions only: a value outside them is asked
 * about and taken as it is when the answer is yes.
 */
export const usual: Record<EntryQuantity, Range> = {
  totalChlorine: [0, 15],
  freeChlorine: [0, 12],
  pH: [6.4, 8.8],
  totalAlkalinity: [20, 300],
  cyanuricAcid: [0, 150],
  calciumHardness: [20, 1000],
  temperature: [4, 38],
};

/** The unit a value is typed in. */
export function typedUnit(quantity: EntryQuantity, system: UnitSystem) {
  if (quantity === 'pH') return 'pH' as const;
  if (quantity === 'temperature') return system === 'metric' ? ('degC' as const) : ('degF' as const);
  return system === 'metric' ? ('mg/L' as const) : ('ppm' as const);
}
