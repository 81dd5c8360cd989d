/**
 * Share of the clear sky's radiation that arrives on a day with so much sunshine: (0.25 + 0.50 n / N) / (0.25 + 0.50), where n is
 * the sunshine and N the day's length; from 1/3 for none to 1. Monthly means lie within about a tenth of it (from memory).
 *
 * Source: Angstrom formula with the coefficients of FAO Irrigation and Drainage Paper 56 (1998), equations 35 and 36; taken
 * for UV as it is for the whole radiation, though cloud takes somewhat less of UV.
 *
 * @param sunshine  h; less than none counts as none, more than the day is long as all of it
 * @param dayLength h, above 0
 */
export function skyOfSunshine(sunshine: number, dayLength: number): number {
  const share = Math.min(1, Math.max(0, sunshine) / dayLength);
  return (0.25 + 0.5 * share) / 0.75;
}
