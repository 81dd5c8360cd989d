import { ionicStrengthOf, KELVIN_AT_ZERO } from './activity';
import { calciteConcentrationProduct } from './equilibrium-constants';
import { carbonateOfWater, ledgerWithoutCarbon } from './ledger';
import { requireWater } from './ranges';
import { constantsOfLedger } from './solve-ledger';
import { DEFAULT_DISSOLVED_SOLIDS, type ModelChoice, type WaterAnalysis } from './water';

/** Stands for "no calcium or no carbonate at all", whose index has no lower end; no real water comes near it. */
export const LOWEST_INDEX = -20;

/**
 * Saturation index of calcite, log10(IAP / Ksp): above 0 scale can form, below 0 plaster can dissolve.
 * IAP = gamma2^2 [Ca++][CO3--], both free of ion pairs, cyanurate, chlorine and borate taken out of the alkalinity;
 * Ksp Plummer & Busenberg 1982, Davies activities. Water without calcium or carbonate gives {@link LOWEST_INDEX}.
 * Uncertainty: within 0.045 of the reference code (RMS 0.017); published Ksp differ by 0.03; pH and alkalinity as
 * read weigh more.
 * @throws WaterRangeError outside the permitted ranges, or when alkalinity is too small for its pH.
 */
export function saturationIndex(water: WaterAnalysis, choice?: ModelChoice): number {
  requireWater(water);
  const ledger = ledgerWithoutCarbon(water);
  const species = carbonateOfWater(water, ledger, constantsOfLedger(ledger, choice));
  const solubility = calciteConcentrationProduct(water.temperature, ionicStrengthOf(ledger.dissolvedSolids), choice);
  return Math.max(LOWEST_INDEX, Math.log10(species.calcium * species.carbonate) - solubility);
}

/** C of the handbook's formula: log10 of calcium hardness (mg/L as CaCO3) less 0.4. */
export function calciumFactor(calciumHardness: number): number {
  return Math.log10(calciumHardness) - 0.4;
}

/** D of the handbook's formula: log10 of alkalinity (mg/L as CaCO3). */
export function alkalinityFactor(alkalinity: number): number {
  return Math.log10(alkalinity);
}

/**
 * pHs of the handbook: (9.3 + A + B) - (C + D), A = (log10 TDS - 1) / 10, B = -13.12 log10(t + 273) + 34.55.
 * Dissolved solids under 1 mg/L count as 1: the logarithm has no lower end.
 */
export function saturationPH(dissolvedSolids: number, celsius: number, hardness: number, alkalinity: number): number {
  const a = (Math.log10(Math.max(1, dissolvedSolids)) - 1) / 10;
  const b = -13.12 * Math.log10(celsius + KELVIN_AT_ZERO - 0.15) + 34.55;
  return 9.3 + a + b - (calciumFactor(hardness) + alkalinityFactor(alkalinity));
}

/**
 * The Langelier index as the handbook's log-term formula gives it, with total alkalinity uncorrected for cyanurate:
 * for comparison only. Off by RMS 0.12 to 0.14 against the reference code on pool water; {@link saturationIndex} is
 * what the product judges by. Water without calcium or alkalinity gives {@link LOWEST_INDEX}.
 * @throws WaterRangeError outside the permitted ranges.
 */
export function langelierIndex(water: WaterAnalysis): number {
  requireWater(water);
  const solids = water.dissolvedSolids ?? DEFAULT_DISSOLVED_SOLIDS;
  const saturated = saturationPH(solids, water.temperature, water.calciumHardness, water.totalAlkalinity);
  return Math.max(LOWEST_INDEX, water.pH - saturated);
}
