import { ionicStrengthOf } from './activity';
import { hypochlorousAcidAt } from './chlorine-balance';
import { type ChlorineConstants, chlorineConstantsAt } from './equilibrium-constants';
import { CHLORINE_MILLIGRAMS_PER_MOLE, CYANURIC_ACID_MILLIGRAMS_PER_MOLE } from './molar-masses';
import { requireWater, WIDE_PH } from './ranges';
import { DEFAULT_DISSOLVED_SOLIDS, type ChlorineSpecies, type ModelChoice, type WaterAnalysis } from './water';

/** The three forms, mg/L as Cl2, of free chlorine (mg/L as Cl2) beside cyanurate (mol/L). No input check. */
export function speciesAt(
  pH: number,
  freeChlorine: number,
  cyanurate: number,
  constants: ChlorineConstants,
): ChlorineSpecies {
  const h = Math.exp(-Math.LN10 * pH);
  const acid = hypochlorousAcidAt(h, freeChlorine / CHLORINE_MILLIGRAMS_PER_MOLE, cyanurate, constants);
  const hypochlorousAcid = acid * CHLORINE_MILLIGRAMS_PER_MOLE;
  const hypochlorite = (constants.hypochlorite / h) * hypochlorousAcid;
  // What is left is bound, so that the three add up exactly.
  return {
    hypochlorousAcid,
    hypochlorite,
    cyanurateBound: Math.max(0, freeChlorine - hypochlorousAcid - hypochlorite),
  };
}

/**
 * Free chlorine by form at the given pH, each mg/L as Cl2: HOCl (what disinfects), OCl-, and bound to cyanurate.
 * Mass balances of chlorine and cyanurate over twelve species, Davies activities.
 * The cyanurate constants were measured at 25 deg C only and are used unchanged at other temperatures.
 * @throws WaterRangeError outside the permitted ranges; pH may be 0 to 14 here, alkalinity is not used.
 * Uncertainty: arithmetic within 0.7 % of the reference code; the constants themselves are not settled, the later
 * published set ({@link ModelChoice}) gives about a third less HOCl.
 */
export function chlorineSpecies(water: WaterAnalysis, choice?: ModelChoice): ChlorineSpecies {
  requireWater(water, WIDE_PH);
  const ionicStrength = ionicStrengthOf(water.dissolvedSolids ?? DEFAULT_DISSOLVED_SOLIDS);
  const constants = chlorineConstantsAt(water.temperature, ionicStrength, choice);
  return speciesAt(water.pH, water.freeChlorine, water.cyanuricAcid / CYANURIC_ACID_MILLIGRAMS_PER_MOLE, constants);
}
