import { activityCoefficients, KELVIN_AT_ZERO, type ActivityCoefficients, waterActivity } from './activity';
import { cyanurateConstants } from './cyanurate-constants';
import {
  boricAcidDissociation,
  calciteSolubility,
  calciumBicarbonatePairing,
  calciumCarbonatePairing,
  carbonDioxideSolubility,
  carbonicAcidFirstDissociation,
  carbonicAcidSecondDissociation,
  hypochlorousAcidDissociation,
  waterDissociation,
} from './published-constants';
import type { ModelChoice } from './water';

/** CO2 in the air the water breathes: log10 of 4.2e-4 atm, as in the reference tables. */
export const LOG_CARBON_DIOXIDE_PRESSURE = -3.38;

/**
 * Factors between *concentrations* (mol/L) and h, the activity of H+, with the activity coefficients already in them.
 * With x = [HOCl] and y = [H3Cy]: [OCl-] = hypochlorite x / h, [H2Cy-] = none1 y / h, [HClCy-] = one1 x y / h,
 * [Cl2Cy-] = two1 x^2 y / h, [Cl3Cy] = three0 x^3 y; the digit is the power of 1/h.
 */
export type ChlorineConstants = {
  hypochlorite: number;
  none1: number;
  none2: number;
  none3: number;
  one0: number;
  one1: number;
  one2: number;
  two0: number;
  two1: number;
  three0: number;
};

/**
 * The same for the rest: [HCO3-] = bicarbonate [CO2] / h, [CO3--] = carbonate [CO2] / h^2,
 * [CaHCO3+] = calciumBicarbonate [Ca++][HCO3-], [CaCO3] = calciumCarbonate [Ca++][CO3--],
 * [OH-] = hydroxide / h, [H+] = proton h, [B(OH)4-] = tetraborate [B(OH)3] / h.
 */
export type CarbonateConstants = {
  bicarbonate: number;
  carbonate: number;
  calciumBicarbonate: number;
  calciumCarbonate: number;
  hydroxide: number;
  proton: number;
  tetraborate: number;
  /** [CO2] in equilibrium with air, mol/L. */
  carbonDioxideInAir: number;
};

/** Everything an integrator may hold as long as temperature and ionic strength stay the same. */
export type EquilibriumConstants = { chlorine: ChlorineConstants; carbonate: CarbonateConstants };

function powerOfTen(exponent: number): number {
  return Math.exp(Math.LN10 * exponent);
}

function chlorineFactors(
  kelvin: number,
  gamma: ActivityCoefficients,
  water: number,
  choice: ModelChoice | undefined,
): ChlorineConstants {
  const set = cyanurateConstants(kelvin, choice?.constants);
  const { neutral, single, double, triple } = gamma;
  const anion = set.firstAcid * neutral;
  const one = (anion * neutral) / (set.oneHydrolysis * water);
  const two = (one * neutral) / (set.twoHydrolysis * water);
  return {
    hypochlorite: (powerOfTen(hypochlorousAcidDissociation(kelvin)) * neutral) / single,
    none1: anion / single,
    none2: (anion * set.secondAcid) / double,
    none3: (anion * set.secondAcid * set.thirdAcid) / triple,
    one0: one / (set.oneChlorineAcid * neutral),
    one1: one / single,
    one2: (one * set.oneChlorineBase) / double,
    two0: two / (set.twoChlorineAcid * neutral),
    two1: two / single,
    three0: two / (set.twoChlorineAcid * set.threeHydrolysis * water),
  };
}

function carbonateFactors(kelvin: number, gamma: ActivityCoefficients): CarbonateConstants {
  const { neutral, single, double } = gamma;
  const first = powerOfTen(carbonicAcidFirstDissociation(kelvin));
  const second = powerOfTen(carbonicAcidSecondDissociation(kelvin));
  return {
    bicarbonate: (first * neutral) / single,
    carbonate: (first * second * neutral) / double,
    calciumBicarbonate: powerOfTen(calciumBicarbonatePairing(kelvin)) * double,
    calciumCarbonate: (powerOfTen(calciumCarbonatePairing(kelvin)) * double * double) / neutral,
    hydroxide: powerOfTen(waterDissociation(kelvin)) / single,
    proton: 1 / single,
    tetraborate: (powerOfTen(boricAcidDissociation(kelvin)) * neutral) / single,
    carbonDioxideInAir: powerOfTen(carbonDioxideSolubility(kelvin) + LOG_CARBON_DIOXIDE_PRESSURE) / neutral,
  };
}

/** Only the chlorine part of {@link constantsAt}; temperature in deg C, ionic strength in mol/L. */
export function chlorineConstantsAt(
  temperature: number,
  ionicStrength: number,
  choice?: ModelChoice,
): ChlorineConstants {
  const gamma = activityCoefficients(temperature, ionicStrength, choice?.activity);
  return chlorineFactors(temperature + KELVIN_AT_ZERO, gamma, waterActivity(ionicStrength), choice);
}

/**
 * The constants at a temperature (deg C) and ionic strength (mol/L), activity coefficients included. Costs about as
 * much as one pH: hold the result while both stay the same. No input check.
 */
export function constantsAt(temperature: number, ionicStrength: number, choice?: ModelChoice): EquilibriumConstants {
  const kelvin = temperature + KELVIN_AT_ZERO;
  const gamma = activityCoefficients(temperature, ionicStrength, choice?.activity);
  return {
    chlorine: chlorineFactors(kelvin, gamma, waterActivity(ionicStrength), choice),
    carbonate: carbonateFactors(kelvin, gamma),
  };
}

/** log10 of the ion activity product constant of calcite over concentrations: Ksp / gamma2^2. */
export function calciteConcentrationProduct(temperature: number, ionicStrength: number, choice?: ModelChoice): number {
  const { double } = activityCoefficients(temperature, ionicStrength, choice?.activity);
  return calciteSolubility(temperature + KELVIN_AT_ZERO) - 2 * Math.log10(double);
}
