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

/** Slow tablets in a week: one of 200 to 230 g for so much water [m3], and so much stabilizer [mg/L] at most. */
export const tabletCap = {
  waterPerTablet: 18,
  tabletMass: 230,
  stabilizerRise: 6,
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
