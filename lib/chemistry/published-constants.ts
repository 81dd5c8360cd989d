/**
 * One function per published constant. Every one returns log10 of the thermodynamic constant (zero ionic strength)
 * at `kelvin`; equations and where they were read: shared/reference/sources.md 1.1, 2.3, 3.1, 2.4.
 * Uncertainty: the carbonate fits about 0.01, the HOCl constant about 0.03 between sources.
 */

/**
 * HOCl = H+ + OCl-: -(3000/T - 10.0686 + 0.0253 T); pK 7.537 at 25 deg C. Fitted 0 to 35 deg C.
 * Source: Morris 1966, J. Phys. Chem. 70:3798. Other sources span 7.53 to 7.60 at 25 deg C.
 */
export function hypochlorousAcidDissociation(kelvin: number): number {
  return -(3000 / kelvin - 10.0686 + 0.0253 * kelvin);
}

/**
 * CO2(gas) = CO2(aq), mol/(L atm). Fitted 0 to 90 deg C.
 * Source: Plummer & Busenberg 1982, Geochim. Cosmochim. Acta 46:1011.
 */
export function carbonDioxideSolubility(kelvin: number): number {
  return 108.3865 + 0.01985076 * kelvin - 6919.53 / kelvin - 40.45154 * Math.log10(kelvin) + 669365 / (kelvin * kelvin);
}

/** CO2(aq) + H2O = H+ + HCO3-. Fitted 0 to 90 deg C. Source: Plummer & Busenberg 1982. */
export function carbonicAcidFirstDissociation(kelvin: number): number {
  return (
    -356.3094 - 0.06091964 * kelvin + 21834.37 / kelvin + 126.8339 * Math.log10(kelvin) - 1684915 / (kelvin * kelvin)
  );
}

/** HCO3- = H+ + CO3--. Fitted 0 to 90 deg C. Source: Plummer & Busenberg 1982. */
export function carbonicAcidSecondDissociation(kelvin: number): number {
  return (
    -107.8871 - 0.03252849 * kelvin + 5151.79 / kelvin + 38.92561 * Math.log10(kelvin) - 563713.9 / (kelvin * kelvin)
  );
}

/** CaCO3(calcite) = Ca++ + CO3--; -8.480 at 25 deg C. Fitted 0 to 90 deg C. Source: Plummer & Busenberg 1982. */
export function calciteSolubility(kelvin: number): number {
  return -171.9065 - 0.077993 * kelvin + 2839.319 / kelvin + 71.595 * Math.log10(kelvin);
}

/** Ca++ + HCO3- = CaHCO3+; 1.11 at 25 deg C. Fitted 0 to 90 deg C. Source: Plummer & Busenberg 1982. */
export function calciumBicarbonatePairing(kelvin: number): number {
  return 1209.12 + 0.31294 * kelvin - 34765.05 / kelvin - 478.782 * Math.log10(kelvin);
}

/** Ca++ + CO3-- = CaCO3(aq); 3.22 at 25 deg C. Fitted 5 to 80 deg C. Source: Plummer & Busenberg 1982. */
export function calciumCarbonatePairing(kelvin: number): number {
  return -1228.732 - 0.299444 * kelvin + 35512.75 / kelvin + 485.818 * Math.log10(kelvin);
}

/** H2O = H+ + OH-; -13.995 at 25 deg C. Source: PHREEQC, database phreeqc.dat (USGS). */
export function waterDissociation(kelvin: number): number {
  return (
    293.29227 + 0.1360833 * kelvin - 10576.913 / kelvin - 123.73158 * Math.log10(kelvin) - 6.996455e-5 * kelvin * kelvin
  );
}

/**
 * B(OH)3 + H2O = B(OH)4- + H+: log K -9.24 at 25 deg C, enthalpy 3.224 kcal/mol, carried along by van 't Hoff.
 * Source: PHREEQC, database phreeqc.dat (USGS).
 */
export function boricAcidDissociation(kelvin: number): number {
  const enthalpyOverGasConstant = (3.224 * 4184) / 8.31446;
  return -9.24 - (enthalpyOverGasConstant / Math.LN10) * (1 / kelvin - 1 / 298.15);
}
