/** What a household's test says about the water. */
export type WaterAnalysis = {
  /** mg/L as Cl2, the chlorine bound to cyanurate included (so do DPD and FAS-DPD kits read it). */
  freeChlorine: number;
  /** mg/L as Cl2; default 0. */
  combinedChlorine?: number;
  /** As an electrode reads it: -log10 of the activity of H+. */
  pH: number;
  /** mg/L as CaCO3, referred to CO2, H3Cy, HOCl, B(OH)3. A kit that titrates to pH 4.5 reads about 3 lower to 1 higher. */
  totalAlkalinity: number;
  /** mg/L as CaCO3. */
  calciumHardness: number;
  /** mg/L as H3Cy, all cyanurate. */
  cyanuricAcid: number;
  /** deg C. */
  temperature: number;
  /** mg/L; default 1000. */
  dissolvedSolids?: number;
  /** mg/L as B; default 0. */
  borate?: number;
};

/** The same water in quantities that add up when something is poured in. */
export type Ledger = {
  /** mg/L as Cl2. */
  freeChlorine: number;
  /** mg/L as Cl2. */
  combinedChlorine: number;
  /** Total cyanurate, mol/L. */
  cyanurate: number;
  /** eq/L; proton zero level CO2, H2O, HOCl, H3Cy, H2ClCy, HCl2Cy, Cl3Cy, B(OH)3. */
  alkalinity: number;
  /** Dissolved inorganic carbon C_T, mol/L, calcium pairs included. */
  inorganicCarbon: number;
  /** Total calcium, mol/L. */
  calcium: number;
  /** Total boron, mol/L. */
  borate: number;
  /** mg/L. */
  dissolvedSolids: number;
  /** deg C. */
  temperature: number;
};

/** Free chlorine by the form it is in, each mg/L as Cl2; the three add up to free chlorine. */
export type ChlorineSpecies = { hypochlorousAcid: number; hypochlorite: number; cyanurateBound: number };

export const DEFAULT_DISSOLVED_SOLIDS = 1000;

/** Which published constants and which activity model; the defaults are the product's choice. */
export type ModelChoice = {
  /** Cyanurate constants; the later set gives about a third less HOCl, and nobody has settled it. */
  constants?: 'obrien-1974' | 'wahman-2019';
  /** 'ideal' sets every activity coefficient to 1: for comparison with tables made that way. */
  activity?: 'davies' | 'ideal';
};
