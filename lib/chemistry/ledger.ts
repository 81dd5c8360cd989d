import { WaterRangeError } from '@/lib/errors';

import { carbonateOfAlkalinity, type CarbonateSpecies } from './carbonate-balance';
import { balanceChlorine, type ChlorineBalance } from './chlorine-balance';
import type { EquilibriumConstants } from './equilibrium-constants';
import {
  ALKALINITY_MILLIGRAMS_PER_EQUIVALENT,
  BORON_MILLIGRAMS_PER_MOLE,
  CHLORINE_MILLIGRAMS_PER_MOLE,
  CYANURIC_ACID_MILLIGRAMS_PER_MOLE,
  HARDNESS_MILLIGRAMS_PER_MOLE,
} from './molar-masses';
import { PERMITTED, requireInRange, requireWater, WIDE_PH } from './ranges';
import { constantsOfLedger, pHOfLedger } from './solve-ledger';
import { DEFAULT_DISSOLVED_SOLIDS, type Ledger, type ModelChoice, type WaterAnalysis } from './water';

/** A shortfall of carbonate alkalinity this small (eq/L, 0.00005 mg/L as CaCO3) is rounding, not bad water. */
const ROUNDING = 1e-9;

/** A ledger with its carbon still open (0), carbon follows from pH. */
export function ledgerWithoutCarbon(water: WaterAnalysis): Ledger {
  return {
    freeChlorine: water.freeChlorine,
    combinedChlorine: water.combinedChlorine ?? 0,
    cyanurate: water.cyanuricAcid / CYANURIC_ACID_MILLIGRAMS_PER_MOLE,
    alkalinity: water.totalAlkalinity / ALKALINITY_MILLIGRAMS_PER_EQUIVALENT,
    inorganicCarbon: 0,
    calcium: water.calciumHardness / HARDNESS_MILLIGRAMS_PER_MOLE,
    borate: (water.borate ?? 0) / BORON_MILLIGRAMS_PER_MOLE,
    dissolvedSolids: water.dissolvedSolids ?? DEFAULT_DISSOLVED_SOLIDS,
    temperature: water.temperature,
  };
}

/** Alkalinity that is not carbonate (eq/L) at a given pH: chlorine, cyanurate, borate, hydroxide less H+. */
export function alkalinityWithoutCarbonate(ledger: Ledger, h: number, constants: EquilibriumConstants): number {
  const k = constants.carbonate;
  const chlorine: ChlorineBalance = { hypochlorousAcid: 0, hypochlorite: 0, alkalinity: 0, slope: 0, drift: 0 };
  const total = ledger.freeChlorine / CHLORINE_MILLIGRAMS_PER_MOLE;
  balanceChlorine(h, total, ledger.cyanurate, constants.chlorine, 0, chlorine);
  const borateRatio = k.tetraborate / h;
  return chlorine.alkalinity + (ledger.borate * borateRatio) / (1 + borateRatio) + k.hydroxide / h - k.proton * h;
}

/**
 * Carbonate species of an analysis at its own pH.
 * @throws WaterRangeError when what is left of the alkalinity for carbonate is negative.
 */
export function carbonateOfWater(
  water: WaterAnalysis,
  ledger: Ledger,
  constants: EquilibriumConstants,
): CarbonateSpecies {
  const h = Math.exp(-Math.LN10 * water.pH);
  const other = alkalinityWithoutCarbonate(ledger, h, constants);
  const left = ledger.alkalinity - other;
  if (left < -ROUNDING) {
    const least = other * ALKALINITY_MILLIGRAMS_PER_EQUIVALENT;
    throw new WaterRangeError('totalAlkalinity', water.totalAlkalinity, least, PERMITTED.totalAlkalinity[1]);
  }
  return carbonateOfAlkalinity(h, Math.max(0, left), ledger.calcium, constants.carbonate);
}

/**
 * The conserved quantities of an analysis; dissolved inorganic carbon follows from pH and total alkalinity.
 * Units as in {@link Ledger}. Total alkalinity is taken as the ledger's own (zero level CO2, H3Cy, HOCl); a kit that
 * titrates to pH 4.5 reads about 3 mg/L lower to 1 higher, below its resolution.
 * @throws WaterRangeError outside the permitted ranges, or when alkalinity is too small for its pH (C_T < 0).
 */
export function ledgerOf(water: WaterAnalysis, choice?: ModelChoice): Ledger {
  requireWater(water);
  const ledger = ledgerWithoutCarbon(water);
  ledger.inorganicCarbon = carbonateOfWater(water, ledger, constantsOfLedger(ledger, choice)).inorganicCarbon;
  return ledger;
}

/**
 * The analysis of a ledger: inverse of {@link ledgerOf} within 1e-6 of pH and 1e-9 relative of the rest. A ledger after
 * a wild dose may lie outside the ranges permitted for readings (alkalinity below 0, pH down to 0 or up to 14): the
 * figures are then extrapolated, and the analysis is not accepted as a reading.
 * @throws WaterRangeError when pH lies outside 0 to 14 or a quantity is not finite.
 */
export function analysisOf(ledger: Ledger, choice?: ModelChoice): WaterAnalysis {
  requireFiniteLedger(ledger);
  const pH = pHOfLedger(ledger, undefined, constantsOfLedger(ledger, choice));
  requireInRange('pH', pH, WIDE_PH);
  return {
    freeChlorine: ledger.freeChlorine,
    combinedChlorine: ledger.combinedChlorine,
    pH,
    totalAlkalinity: ledger.alkalinity * ALKALINITY_MILLIGRAMS_PER_EQUIVALENT,
    calciumHardness: ledger.calcium * HARDNESS_MILLIGRAMS_PER_MOLE,
    cyanuricAcid: ledger.cyanurate * CYANURIC_ACID_MILLIGRAMS_PER_MOLE,
    temperature: ledger.temperature,
    dissolvedSolids: ledger.dissolvedSolids,
    borate: ledger.borate * BORON_MILLIGRAMS_PER_MOLE,
  };
}

function requireFiniteLedger(ledger: Ledger): void {
  const notNegative = [0, Number.MAX_VALUE] as const;
  requireInRange('temperature', ledger.temperature, PERMITTED.temperature);
  requireInRange('freeChlorine', ledger.freeChlorine, notNegative);
  requireInRange('combinedChlorine', ledger.combinedChlorine, notNegative);
  requireInRange('cyanurate', ledger.cyanurate, notNegative);
  requireInRange('alkalinity', ledger.alkalinity, [-Number.MAX_VALUE, Number.MAX_VALUE]);
  requireInRange('inorganicCarbon', ledger.inorganicCarbon, notNegative);
  requireInRange('calcium', ledger.calcium, notNegative);
  requireInRange('borate', ledger.borate, notNegative);
  requireInRange('dissolvedSolids', ledger.dissolvedSolids, notNegative);
}
