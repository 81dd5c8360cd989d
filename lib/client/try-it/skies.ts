/**
 * Skies that can be tried, as the share of clear-sky UV that comes through. US EPA, "Calculating the UV Index": clear skies
 * let virtually 100 % through, an overcast one 31 %.
 */
export const skies = { clear: 1, overcast: 0.31 } as const;
export type TriedSky = keyof typeof skies;
