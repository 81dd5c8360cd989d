import type { ModelChoice } from './water';

/** Activity coefficients of an uncharged species and of ions with one, two and three charges. */
export type ActivityCoefficients = { neutral: number; single: number; double: number; triple: number };

export const KELVIN_AT_ZERO = 273.15;

/**
 * Ionic strength in mol/L from dissolved solids in mg/L: I = 1.6e-5 * dissolvedSolids.
 * Pool salts are mostly sodium chloride and bicarbonate; the textbook 2.5e-5 fits river water, and with it HOCl is off
 * by 2.5 % and the saturation index by 0.06 against the reference code (shared/reference/README.md, choices).
 */
export function ionicStrengthOf(dissolvedSolids: number): number {
  return 1.6e-5 * dissolvedSolids;
}

/**
 * Activity of water by Raoult's law for a salt of two ions: 1 - 0.017 * 2 I, as PHREEQC (USGS) has it. A tenth of a per
 * cent, but it enters HOCl once for each chlorine that leaves cyanurate.
 */
export function waterActivity(ionicStrength: number): number {
  return 1 - 0.034 * ionicStrength;
}

/**
 * Dielectric constant of water at `celsius`; 87.740 - 0.40008 t + 9.398e-4 t^2 - 1.410e-6 t^3.
 * Range 0 to 100 deg C. Source: Malmberg & Maryott 1956, J. Res. Natl. Bur. Stand. 56:1.
 */
export function dielectricConstant(celsius: number): number {
  return 87.74 + celsius * (-0.40008 + celsius * (9.398e-4 - celsius * 1.41e-6));
}

/**
 * Debye-Huckel coefficient A in (L/mol)^0.5 for log10 of the coefficient: 1.82e6 (epsilon T)^-1.5; 0.510 at 25 deg C.
 * Source: Stumm & Morgan, Aquatic Chemistry, 3rd ed., table 3.3.
 */
export function debyeHuckelCoefficient(celsius: number): number {
  const product = dielectricConstant(celsius) * (celsius + KELVIN_AT_ZERO);
  return 1.82e6 / (product * Math.sqrt(product));
}

/**
 * Davies equation: log10 gamma_z = -A z^2 (sqrt I / (1 + sqrt I) - 0.3 I); uncharged species: log10 gamma = 0.1 I.
 * Range: I up to 0.5 mol/L (30000 mg/L of dissolved solids gives 0.48). Source: Davies 1962, Ion Association;
 * the same form as in PHREEQC.
 */
export function activityCoefficients(
  celsius: number,
  ionicStrength: number,
  model: ModelChoice['activity'] = 'davies',
): ActivityCoefficients {
  if (model === 'ideal') return { neutral: 1, single: 1, double: 1, triple: 1 };
  const root = Math.sqrt(ionicStrength);
  const single = Math.exp(-Math.LN10 * debyeHuckelCoefficient(celsius) * (root / (1 + root) - 0.3 * ionicStrength));
  const square = single * single;
  const double = square * square;
  return { neutral: Math.exp(Math.LN10 * 0.1 * ionicStrength), single, double, triple: double * double * single };
}
