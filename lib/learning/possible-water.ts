import { ledgerOf, type WaterAnalysis } from '@/lib/chemistry';
import { WaterRangeError } from '@/lib/errors';

/** Alkalinity beyond the least that a pH needs [mg/L as CaCO3]. */
const A_TRACE = 0.01;

/** The same water; where its alkalinity cannot carry its pH, with as much as it needs. */
export function possibleWater<Water extends WaterAnalysis>(water: Water): Water {
  try {
    ledgerOf(water);
    return water;
  } catch (error) {
    if (!(error instanceof WaterRangeError) || error.field !== 'totalAlkalinity') throw error;
    return { ...water, totalAlkalinity: error.low + A_TRACE };
  }
}
