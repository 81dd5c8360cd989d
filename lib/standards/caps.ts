import type { Source } from './limits';

const calculatedAmount: Source = {
  kind: 'practice',
  text: 'no public text names a largest dose; ours, from the arithmetic of the water model. The label comes first.',
};

/** Most that one evening may add of each fast chlorine: free chlorine [mg/L]. */
export const fastChlorineCap = {
  'calcium-hypochlorite': { value: 4, source: calculatedAmount },
  'sodium-hypochlorite': { value: 4, source: calculatedAmount },
  dichlor: { value: 2, source: calculatedAmount },
} as const;

/**
 * Most that one evening may add of everything else, for each m3 of water: amounts of these strengths, less of stronger and
 * more of weaker products in proportion [g/m3; mL/m3 for hydrochloric acid]. Acid lowers pH by about 0.4 then,
 * bicarbonate raises alkalinity by 20, calcium chloride hardness by 30, cyanuric acid stabilizer by 20.
 */
export const companionCap = {
  'hydrochloric-acid': { perCubicMetre: 16, strength: 31.45, source: calculatedAmount },
  'sodium-bisulfate': { perCubicMetre: 20, strength: 93, source: calculatedAmount },
  'sodium-bicarbonate': { perCubicMetre: 34, strength: 100, source: calculatedAmount },
  'sodium-carbonate': { perCubicMetre: 10, strength: 100, source: calculatedAmount },
  'calcium-chloride': { perCubicMetre: 43, strength: 77, source: calculatedAmount },
  'cyanuric-acid': { perCubicMetre: 20, strength: 100, source: calculatedAmount },
} as const;

/** Slow tablets in a week: one of 200 to 230 g for so much water [m3], and so much stabilizer [mg/L] at most. */
export const tabletCap = {
  waterPerTablet: 18,
  tabletMass: 230,
  stabilizerRise: 6,
  /** Tablets given so recently count to the week's [h]: a day less than a week, so that a weekly habit stays one. */
  countedFor: 6 * 24,
  source: { kind: 'practice', text: 'about three tablets a week in a pool of 75 m3' } satisfies Source,
} as const;

/** Least time without swimming after each kind of dose [h]; the label comes first. */
export const swimWaitHours: Record<string, number> = {
  'calcium-hypochlorite': 4,
  'sodium-hypochlorite': 4,
  dichlor: 4,
  trichlor: 0.25,
  'hydrochloric-acid': 4,
  'sodium-bisulfate': 4,
  'sodium-bicarbonate': 2,
  'sodium-carbonate': 4,
  'calcium-chloride': 4,
  'cyanuric-acid': 4,
};

/** pH under which tablets, themselves acid, are no candidate. */
export const TABLETS_NEED_PH = 7.2;

/** Share of the labelled strength under which a bottle of liquid is no longer planned. */
export const LIQUID_STRENGTH_SHARE = 0.5;
