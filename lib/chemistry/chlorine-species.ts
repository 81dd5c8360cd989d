import { ionicStrengthOf } from './activity';
import { balanceChlorine, type ChlorineBalance } from './chlorine-balance';
import { chlorineConstantsAt } from './equilibrium-constants';
import { CHLORINE_MILLIGRAMS_PER_MOLE, CYANURIC_ACID_MILLIGRAMS_PER_MOLE } from './molar-masses';
import { requireWater, WIDE_PH } from './ranges';
import { speciesOf } from './solve-ledger';
import { DEFAULT_DISSOLVED_SOLIDS, type ChlorineSpecies, type ModelChoice, type WaterAnalysis } from './water';

// Working space, filled anew by each call.
const balance: ChlorineBalance = { hypochlorousAcid: 0, hypochlorite: 0, alkalinity: 0, slope: 0, drift: 0 };

/**
 * Free chlorine by form at the given pH, each mg/L as Cl2: HOCl (what disinfects), OCl-, and bound to cyanurate.
 * Mass balances of chlorine and cyanurate over eleven species, Davies activities.
 * The cyanurate constants were measured at 25 deg C only and are used unchanged at other temperatures.
 * @throws WaterRangeError outside the permitted ranges; pH may be 0 to 14 here, alkalinity is not used.
 * Uncertainty: arithmetic within 0.7 % of the reference code; the constants themselves are not settled, the later
 * published set ({@link ModelChoice}) gives about a third less HOCl.
 */
export function chlorineSpecies(water: WaterAnalysis, choice?: ModelChoice): ChlorineSpecies {
  requireWater(water, WIDE_PH);
  const ionicStrength = ionicStrengthOf(water.dissolvedSolids ?? DEFAULT_DISSOLVED_SOLIDS);
  const constants = chlorineConstantsAt(water.temperature, ionicStrength, choice);
  const chlorine = water.freeChlorine / CHLORINE_MILLIGRAMS_PER_MOLE;
  const cyanurate = water.cyanuricAcid / CYANURIC_ACID_MILLIGRAMS_PER_MOLE;
  balanceChlorine(Math.exp(-Math.LN10 * water.pH), chlorine, cyanurate, constants, 0, balance);
  return speciesOf(water.freeChlorine, balance);
}
