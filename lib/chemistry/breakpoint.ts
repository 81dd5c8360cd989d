import { MOLAR_MASS } from './molar-masses';
import { PERMITTED, requireInRange } from './ranges';

// For the help page alone. No plan holds a breakpoint dose: combined chlorine in a pool is mostly organic and has no sharp
// breakpoint, so the product plans a treatment evening and a test after it.

/**
 * g of chlorine (as Cl2) for each g of ammonia nitrogen, from which on no combined chlorine is left: 7.59.
 *
 *     2 NH3 + 3 HOCl -> N2 + 3 HCl + 3 H2O
 *
 * Source: stoichiometry. In the field 8 to 10 is usual [from memory], since some nitrogen ends as nitrate.
 */
export const CHLORINE_PER_NITROGEN_AT_BREAKPOINT = (3 * MOLAR_MASS.chlorine) / (2 * MOLAR_MASS.nitrogen);

/** The same for monochloramine, NH3 + HOCl -> NH2Cl + H2O: 5.06, above which breakpoint begins. Source: stoichiometry. */
export const CHLORINE_PER_NITROGEN_IN_MONOCHLORAMINE = MOLAR_MASS.chlorine / MOLAR_MASS.nitrogen;

/**
 * How many times combined chlorine agencies still tell people to raise free chlorine by. The rule takes mg/L of combined
 * chlorine, which is given as Cl2, for mg/L of nitrogen.
 * Source: KFL&A Public Health (Ontario), breakpoint chlorination sheet, 15 November 2011.
 */
export const FIELD_RULE_TIMES_COMBINED = 10;

/**
 * Free chlorine that takes combined chlorine away by each account [mg/L as Cl2].
 *
 * `byStoichiometry`: what turns monochloramine into nitrogen, 2 NH2Cl + HOCl -> N2 + 3 HCl + H2O, half of it.
 * `byFieldRule`: ten times it.
 *
 * @param combinedChlorine mg/L as Cl2, 0 to 50
 * @throws WaterRangeError outside that range
 * Uncertainty: between the two lies a factor of 20, and neither holds for organic chloramines, which react over hours to
 * days.
 */
export function breakpointArithmetic(combinedChlorine: number): { byStoichiometry: number; byFieldRule: number } {
  requireInRange('combinedChlorine', combinedChlorine, PERMITTED.combinedChlorine);
  const perCombined = CHLORINE_PER_NITROGEN_AT_BREAKPOINT / CHLORINE_PER_NITROGEN_IN_MONOCHLORAMINE - 1;
  return {
    byStoichiometry: perCombined * combinedChlorine,
    byFieldRule: FIELD_RULE_TIMES_COMBINED * combinedChlorine,
  };
}
