import { WaterRangeError } from '@/lib/errors';
import { measuredRange } from '@/lib/schemas/measured-range';

import type { WaterAnalysis } from './water';

export type Range = readonly [low: number, high: number];

/** What the water model permits. Inside, a fit may be extrapolated; the docstring of the constant says how far it holds. */
export const PERMITTED = {
  ...measuredRange,
  dissolvedSolids: [0, 30000],
  borate: [0, 100],
} as const satisfies Record<keyof WaterAnalysis, Range>;

/** Speciation at a given pH needs no alkalinity, so it may look further; so may the water after a wild dose. */
export const WIDE_PH: Range = [0, 14];

/**
 * @throws WaterRangeError unless low <= value <= high; NaN and infinities fail too.
 */
export function requireInRange(field: string, value: number, range: Range): void {
  if (!(value >= range[0] && value <= range[1])) throw new WaterRangeError(field, value, range[0], range[1]);
}

/** @throws WaterRangeError unless 0 < value <= high. */
export function requireAboveZero(field: string, value: number, high: number): void {
  if (!(value > 0 && value <= high)) throw new WaterRangeError(field, value, 0, high);
}

/**
 * Checks every field of an analysis.
 * @throws WaterRangeError naming the first field outside its permitted range.
 */
export function requireWater(water: WaterAnalysis, pHRange: Range = PERMITTED.pH): void {
  requireInRange('freeChlorine', water.freeChlorine, PERMITTED.freeChlorine);
  requireInRange('pH', water.pH, pHRange);
  requireInRange('totalAlkalinity', water.totalAlkalinity, PERMITTED.totalAlkalinity);
  requireInRange('calciumHardness', water.calciumHardness, PERMITTED.calciumHardness);
  requireInRange('cyanuricAcid', water.cyanuricAcid, PERMITTED.cyanuricAcid);
  requireInRange('temperature', water.temperature, PERMITTED.temperature);
  if (water.combinedChlorine !== undefined) {
    requireInRange('combinedChlorine', water.combinedChlorine, PERMITTED.combinedChlorine);
  }
  if (water.dissolvedSolids !== undefined) {
    requireInRange('dissolvedSolids', water.dissolvedSolids, PERMITTED.dissolvedSolids);
  }
  if (water.borate !== undefined) requireInRange('borate', water.borate, PERMITTED.borate);
}
