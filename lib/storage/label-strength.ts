/**
 * How a label of liquid chlorine states its strength. "10 %" may mean any of them, and they lie up to a quarter apart.
 *
 * - trade: available chlorine by volume, g Cl2 per 100 mL
 * - available-by-weight: available chlorine, % by weight
 * - hypochlorite-by-weight: sodium hypochlorite, % by weight
 * - hypochlorite-by-volume: sodium hypochlorite, g per 100 mL
 */
export const liquidStrengthBases = [
  'hypochlorite-by-weight',
  'hypochlorite-by-volume',
  'available-by-weight',
  'trade',
] as const;
export type LiquidStrengthBasis = (typeof liquidStrengthBases)[number];

/** g of available chlorine that 1 g of sodium hypochlorite counts as: 70.906 / 74.442. */
export const AVAILABLE_PER_HYPOCHLORITE = 70.906 / 74.442;

/** Rise of the density [g/mL] for each per cent of sodium hypochlorite by weight. */
export const DENSITY_RISE = 0.0152;

/**
 * Strength of liquid chlorine in trade per cent, g Cl2 per 100 mL, as the shelf keeps it.
 *
 * Formula: trade % = weight % available chlorine x density; weight % available = weight % NaOCl x 70.906 / 74.442; density
 * 1 + 0.0152 x weight % NaOCl [g/mL].
 * Range: 0 to 20 % by weight, what bottles hold. Uncertainty: the density varies by 0.02 with the salt and lye left from
 * making it, that is 2 % of the strength.
 * Source: the definition in Indiana 327 IAC 8-3.4-24; factor and density (12.5 % by weight is 1.19 g/mL) as quoted in
 * sources.md, part on strengths.
 */
export function tradePercentOf(printed: number, basis: LiquidStrengthBasis): number {
  switch (basis) {
    case 'trade':
      return printed;
    case 'available-by-weight':
      return printed * densityAt(printed / AVAILABLE_PER_HYPOCHLORITE);
    case 'hypochlorite-by-weight':
      return printed * AVAILABLE_PER_HYPOCHLORITE * densityAt(printed);
    case 'hypochlorite-by-volume':
      return printed * AVAILABLE_PER_HYPOCHLORITE;
  }
}

function densityAt(hypochloriteWeightPercent: number): number {
  return 1 + DENSITY_RISE * hypochloriteWeightPercent;
}
