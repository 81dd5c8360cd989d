import type { ModelChoice } from './water';

/**
 * Thermodynamic constants of the chlorinated cyanurates. Hydrolysis: one chlorine leaves as HOCl.
 *
 * | field            | reaction                          |
 * | ---------------- | --------------------------------- |
 * | firstAcid        | H3Cy = H2Cy- + H+                 |
 * | secondAcid       | H2Cy- = HCy-- + H+                |
 * | thirdAcid        | HCy-- = Cy--- + H+                |
 * | oneChlorineAcid  | H2ClCy = HClCy- + H+              |
 * | oneChlorineBase  | HClCy- = ClCy-- + H+              |
 * | twoChlorineAcid  | HCl2Cy = Cl2Cy- + H+              |
 * | oneHydrolysis    | HClCy- + H2O = H2Cy- + HOCl       |
 * | twoHydrolysis    | Cl2Cy- + H2O = HClCy- + HOCl      |
 * | threeHydrolysis  | Cl3Cy + H2O = HCl2Cy + HOCl       |
 */
export type CyanurateConstants = {
  firstAcid: number;
  secondAcid: number;
  thirdAcid: number;
  oneChlorineAcid: number;
  oneChlorineBase: number;
  twoChlorineAcid: number;
  oneHydrolysis: number;
  twoHydrolysis: number;
  threeHydrolysis: number;
};

/**
 * O'Brien, Morris & Butler 1974 (in Rubin, Chemistry of Water Supply, Treatment and Distribution, p. 333), as coded for
 * EPA/600/S-17/165. Measured at 25 deg C only: used unchanged at every temperature, because no later work gives a
 * temperature dependence for the whole set. oneHydrolysis follows from the others: 10.12 + 6.90 - 11.40 = 5.62.
 */
export const OBRIEN_1974: CyanurateConstants = {
  firstAcid: 10 ** -6.88,
  secondAcid: 10 ** -11.4,
  thirdAcid: 10 ** -13.5,
  oneChlorineAcid: 10 ** -5.33,
  oneChlorineBase: 10 ** -10.12,
  twoChlorineAcid: 10 ** -3.75,
  oneHydrolysis: 10 ** -5.62,
  twoHydrolysis: 10 ** -4.51,
  threeHydrolysis: 10 ** -1.8,
};

/**
 * pK of H3Cy = H2Cy- + H+: 1743/T + 1.12; 6.97 at 25 deg C. Measured 5 to 35 deg C.
 * Source: Wahman 2018, Environ. Sci.: Water Res. Technol. 4:1522.
 */
export function cyanuricAcidPK(kelvin: number): number {
  return 1743 / kelvin + 1.12;
}

/**
 * pK of Cl2Cy- + H2O = HClCy- + HOCl: 2028/T - 2.15; 4.65 +- 0.06 at 25 deg C. Measured 5 to 35 deg C.
 * Source: Wahman & Alexander 2019, Environ. Eng. Sci. 36:283.
 */
export function dichlorocyanurateHydrolysisPK(kelvin: number): number {
  return 2028 / kelvin - 2.15;
}

/**
 * pK of HClCy- + H2O = H2Cy- + HOCl: 2229/T - 1.65; 5.83 +- 0.02 at 25 deg C.
 * The 25 deg C value is Wahman & Alexander 2019; the slope is the enthalpy of 42.7 kJ/mol the reference tables use.
 */
export function chlorocyanurateHydrolysisPK(kelvin: number): number {
  return 2229 / kelvin - 1.65;
}

/** The cyanurate set of the choice at `kelvin`. The later set replaces three constants and keeps O'Brien's others. */
export function cyanurateConstants(
  kelvin: number,
  choice: ModelChoice['constants'] = 'obrien-1974',
): CyanurateConstants {
  if (choice === 'obrien-1974') return OBRIEN_1974;
  return {
    ...OBRIEN_1974,
    firstAcid: 10 ** -cyanuricAcidPK(kelvin),
    oneHydrolysis: 10 ** -chlorocyanurateHydrolysisPK(kelvin),
    twoHydrolysis: 10 ** -dichlorocyanurateHydrolysisPK(kelvin),
  };
}
