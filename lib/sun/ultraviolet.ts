/** The sun at which the photolysis rates of Nowell & Hoigne 1992 were measured: summer noon at 47 degrees north. */
export const REFERENCE_ELEVATION = 66.4;
export const ULTRAVIOLET_EXPONENT = 2.42;
const radians = Math.PI / 180;
const reference = Math.sin(REFERENCE_ELEVATION * radians);

/**
 * UV on a level surface under a clear sky, as a share of that at the reference sun: (sin e / sin 66.4 deg)^2.42, 0 at
 * night. At most 1.24, in the tropics. Ozone is taken as constant: 300 to 350 Dobson units change the UV index by a
 * sixth, which the pool's learnt sun factor takes up.
 *
 * @param elevation solar elevation e [degrees]
 * Source: Madronich 2007, Photochem. Photobiol. 83:1537, for the exponent of the UV index.
 */
export function ultravioletWeight(elevation: number): number {
  return ultravioletWeightOfSine(Math.sin(elevation * radians));
}

/** The same from the sine of the elevation. */
export function ultravioletWeightOfSine(sine: number): number {
  // Twice as quick as `**`, and a week asks three hundred times.
  return sine <= 0 ? 0 : Math.exp(ULTRAVIOLET_EXPONENT * Math.log(sine / reference));
}
