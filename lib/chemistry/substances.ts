import type { substances } from '@/lib/schemas/shelf-product';

import { MOLAR_MASS } from './molar-masses';

export type Substance = (typeof substances)[number];

/** What a dose brings into the water; per unit of amount or in all, as the function that returns it says. */
export type DoseContents = {
  /** mol of chlorine(+1); below 0 where the substance can remove up to that much. */
  freeChlorine: number;
  /** mol. */
  cyanurate: number;
  /** eq. */
  alkalinity: number;
  /** mol. */
  inorganicCarbon: number;
  /** mol. */
  calcium: number;
  /** g. */
  dissolvedSolids: number;
};

export type SubstanceFacts = {
  /** Unit of the amount. */
  unit: 'g' | 'mL';
  /** What the strength counts: available chlorine by weight, trade per cent (g Cl2 per 100 mL), or weight per cent. */
  strengthOf: 'available-chlorine' | 'trade-percent' | 'weight-percent';
  defaultStrength: number;
  /** Strength of the pure substance: nothing can be stronger. */
  pureStrength: number;
  /** Contents per g or mL at a strength, without free alkali. */
  contents: (strength: number) => DoseContents;
  /** Per g or mL and per cent of free alkali, where the product carries some. */
  alkali?: DoseContents;
};

const NOTHING: DoseContents = {
  freeChlorine: 0,
  cyanurate: 0,
  alkalinity: 0,
  inorganicCarbon: 0,
  calcium: 0,
  dissolvedSolids: 0,
};

/** mol of chlorine in 1 g of a solid of `strength` % available chlorine, or 1 mL of a liquid of that trade per cent. */
function chlorineMoles(strength: number): number {
  return strength / 100 / MOLAR_MASS.chlorine;
}

function weighed(strength: number, molarMass: number): number {
  return strength / 100 / molarMass;
}

export const CYANURATE_OF_DICHLOR = 219.95;
export const THIOSULFATE_ANHYDROUS_SHARE = 158.11 / 248.18;

/** Mass of sodium thiosulfate pentahydrate per mass of chlorine removed: AWWA field value (sources.md 4.3, 4.4). */
export const THIOSULFATE_PER_CHLORINE = 1.9;

/** Density of the liquid that free NaOH is counted in, g/mL. */
export const LIQUID_HYPOCHLORITE_DENSITY = 1.2;

/** Density of hydrochloric acid, g/mL, of weight per cent: 1.160 at 31.45 %. */
export function hydrochloricAcidDensity(strength: number): number {
  return 1 + 0.00509 * strength;
}

/**
 * Stoichiometry of every substance the model knows. Proton zero level CO2, H2O, HOCl, H3Cy and its chlorinated forms,
 * so trichlor changes no alkalinity and dichlor, a sodium salt, one equivalent.
 */
export const SUBSTANCES: Readonly<Record<Substance, SubstanceFacts>> = {
  trichlor: {
    unit: 'g',
    strengthOf: 'available-chlorine',
    defaultStrength: 91.53,
    pureStrength: 91.53,
    contents: (strength) => {
      const moles = chlorineMoles(strength) / 3;
      return { ...NOTHING, freeChlorine: 3 * moles, cyanurate: moles, dissolvedSolids: moles * MOLAR_MASS.trichlor };
    },
  },
  dichlor: {
    unit: 'g',
    strengthOf: 'available-chlorine',
    defaultStrength: 55.4,
    pureStrength: 55.4,
    contents: (strength) => {
      const moles = chlorineMoles(strength) / 2;
      return {
        ...NOTHING,
        freeChlorine: 2 * moles,
        cyanurate: moles,
        alkalinity: moles,
        dissolvedSolids: moles * CYANURATE_OF_DICHLOR,
      };
    },
  },
  'calcium-hypochlorite': {
    unit: 'g',
    strengthOf: 'available-chlorine',
    defaultStrength: 99.18,
    pureStrength: 99.18,
    contents: (strength) => {
      const moles = chlorineMoles(strength) / 2;
      return {
        ...NOTHING,
        freeChlorine: 2 * moles,
        alkalinity: 2 * moles,
        calcium: moles,
        dissolvedSolids: moles * MOLAR_MASS.calciumHypochlorite,
      };
    },
    alkali: {
      ...NOTHING,
      alkalinity: 2 * weighed(1, MOLAR_MASS.calciumHydroxide),
      calcium: weighed(1, MOLAR_MASS.calciumHydroxide),
      dissolvedSolids: 0.01,
    },
  },
  'sodium-hypochlorite': {
    unit: 'mL',
    strengthOf: 'trade-percent',
    defaultStrength: 12.5,
    pureStrength: 95.25,
    contents: (strength) => {
      const moles = chlorineMoles(strength);
      // Made from chlorine and lye: as much sodium chloride as hypochlorite comes with it.
      const mass = MOLAR_MASS.sodiumHypochlorite + MOLAR_MASS.sodiumChloride;
      return { ...NOTHING, freeChlorine: moles, alkalinity: moles, dissolvedSolids: moles * mass };
    },
    alkali: {
      ...NOTHING,
      alkalinity: weighed(1, MOLAR_MASS.sodiumHydroxide) * LIQUID_HYPOCHLORITE_DENSITY,
      dissolvedSolids: 0.01 * LIQUID_HYPOCHLORITE_DENSITY,
    },
  },
  'hydrochloric-acid': {
    unit: 'mL',
    strengthOf: 'weight-percent',
    defaultStrength: 31.45,
    pureStrength: 100,
    contents: (strength) => {
      const moles = weighed(strength, MOLAR_MASS.hydrogenChloride) * hydrochloricAcidDensity(strength);
      return { ...NOTHING, alkalinity: -moles, dissolvedSolids: moles * MOLAR_MASS.hydrogenChloride };
    },
  },
  'sodium-bisulfate': {
    unit: 'g',
    strengthOf: 'weight-percent',
    defaultStrength: 100,
    pureStrength: 100,
    contents: (strength) => ({
      ...NOTHING,
      alkalinity: -weighed(strength, MOLAR_MASS.sodiumBisulfate),
      dissolvedSolids: strength / 100,
    }),
  },
  'sodium-bicarbonate': {
    unit: 'g',
    strengthOf: 'weight-percent',
    defaultStrength: 100,
    pureStrength: 100,
    contents: (strength) => {
      const moles = weighed(strength, MOLAR_MASS.sodiumBicarbonate);
      return { ...NOTHING, alkalinity: moles, inorganicCarbon: moles, dissolvedSolids: strength / 100 };
    },
  },
  'sodium-carbonate': {
    unit: 'g',
    strengthOf: 'weight-percent',
    defaultStrength: 100,
    pureStrength: 100,
    contents: (strength) => {
      const moles = weighed(strength, MOLAR_MASS.sodiumCarbonate);
      return { ...NOTHING, alkalinity: 2 * moles, inorganicCarbon: moles, dissolvedSolids: strength / 100 };
    },
  },
  'calcium-chloride': {
    unit: 'g',
    strengthOf: 'weight-percent',
    defaultStrength: 100,
    pureStrength: 100,
    contents: (strength) => ({
      ...NOTHING,
      calcium: weighed(strength, MOLAR_MASS.calciumChloride),
      dissolvedSolids: strength / 100,
    }),
  },
  'cyanuric-acid': {
    unit: 'g',
    strengthOf: 'weight-percent',
    defaultStrength: 100,
    pureStrength: 100,
    contents: (strength) => ({
      ...NOTHING,
      cyanurate: weighed(strength, MOLAR_MASS.cyanuricAcid),
      dissolvedSolids: strength / 100,
    }),
  },
  'sodium-thiosulfate': {
    unit: 'g',
    strengthOf: 'weight-percent',
    defaultStrength: 100,
    pureStrength: 100,
    contents: (strength) => {
      const removed = weighed(strength, MOLAR_MASS.chlorine) / THIOSULFATE_PER_CHLORINE;
      return {
        ...NOTHING,
        freeChlorine: -removed,
        alkalinity: -removed,
        dissolvedSolids: (strength / 100) * THIOSULFATE_ANHYDROUS_SHARE,
      };
    },
  },
};
