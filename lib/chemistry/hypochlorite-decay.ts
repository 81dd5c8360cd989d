import { KELVIN_AT_ZERO } from './activity';
import { MOLAR_MASS } from './molar-masses';
import { PERMITTED, requireAboveZero, requireInRange } from './ranges';
import { SUBSTANCES } from './substances';

/** Free lye of stored liquid, mol/L: about 0.3 to 0.4 % by weight, as makers add it to keep the liquid alive. */
export const EXCESS_LYE = 0.1;
const SECONDS_PER_DAY = 86400;
export const GAS_CONSTANT = 8.314;

/**
 * Second-order rate constant of hypochlorite in its own strong solution, 1/(mol/L s):
 * log10 k2 = 0.149 I + log10(2.083e10 T exp(-1.018e5 / RT) exp(-56.5 / R)).
 * Range: I 1 to 6 mol/L, 0.7 to 3 mol/L of OCl-, 15 to 55 deg C, pH 11 to 14.
 * Source: Adam & Gordon 1999, Inorg. Chem. 38:1299.
 */
export function hypochloriteDecayRate(celsius: number, ionicStrength: number): number {
  const kelvin = celsius + KELVIN_AT_ZERO;
  const free = 2.083e10 * kelvin * Math.exp(-1.018e5 / (GAS_CONSTANT * kelvin)) * Math.exp(-56.5 / GAS_CONSTANT);
  return 10 ** (0.149 * ionicStrength) * free;
}

/** Half-life in days of liquid hypochlorite: 1 / (k2 C0), I = 2 C0 + excess lye (as much salt as hypochlorite). */
export function hypochloriteHalfLife(strength: number, celsius: number): number {
  const concentration = (strength * 10) / MOLAR_MASS.chlorine;
  const rate = hypochloriteDecayRate(celsius, 2 * concentration + EXCESS_LYE);
  return 1 / (rate * concentration * SECONDS_PER_DAY);
}

/**
 * Trade per cent (g Cl2 per 100 mL) left of liquid chlorine stored closed and dark at a steady temperature:
 * strength / (1 + days / half-life), the half-life being that of the fresh strength. The ionic strength hardly changes
 * as hypochlorite turns into chloride and chlorate, so the rate constant stays.
 *
 * Range: the law was measured for 5 to 21 trade % at 15 to 55 deg C and is extrapolated beyond. Reproduces 43 % and
 * 60 % left after 60 days at 32 deg C for 13 and 10 % by weight; liquid with traces of metal or in the light is weaker.
 * @throws WaterRangeError for a strength not above 0 or above pure, a temperature outside -2 to 60, days below 0.
 */
export function storedHypochloriteStrength(stored: { strength: number; temperature: number; days: number }): number {
  const { strength, temperature, days } = stored;
  requireAboveZero('strength', strength, SUBSTANCES['sodium-hypochlorite'].pureStrength);
  requireInRange('temperature', temperature, PERMITTED.temperature);
  requireInRange('days', days, [0, 36525]);
  return strength / (1 + days / hypochloriteHalfLife(strength, temperature));
}
