/**
 * Molar masses in g/mol (IUPAC standard atomic weights, rounded as the reference tables round them;
 * isocyanurates as in EPA/600/S-17/165, Table 1).
 */
export const MOLAR_MASS = {
  chlorine: 70.906,
  nitrogen: 14.007,
  calciumCarbonate: 100.087,
  cyanuricAcid: 129.074,
  boron: 10.81,
  carbonDioxide: 44.0095,
  hydrogenChloride: 36.461,
  sodiumBisulfate: 120.06,
  sodiumBicarbonate: 84.007,
  sodiumCarbonate: 105.988,
  sodiumHypochlorite: 74.442,
  sodiumChloride: 58.443,
  sodiumHydroxide: 39.997,
  calciumHypochlorite: 142.98,
  calciumHydroxide: 74.093,
  calciumChloride: 110.98,
  trichlor: 232.41,
  dichlorDihydrate: 255.98,
} as const;

/** mg/L as Cl2 of one mol/L of chlorine(+1). */
export const CHLORINE_MILLIGRAMS_PER_MOLE = MOLAR_MASS.chlorine * 1000;

/** mg/L as CaCO3 of one eq/L of alkalinity: two equivalents to the mole. */
export const ALKALINITY_MILLIGRAMS_PER_EQUIVALENT = (MOLAR_MASS.calciumCarbonate * 1000) / 2;

/** mg/L as CaCO3 of one mol/L of calcium. */
export const HARDNESS_MILLIGRAMS_PER_MOLE = MOLAR_MASS.calciumCarbonate * 1000;

export const CYANURIC_ACID_MILLIGRAMS_PER_MOLE = MOLAR_MASS.cyanuricAcid * 1000;

export const BORON_MILLIGRAMS_PER_MOLE = MOLAR_MASS.boron * 1000;
