import type { CarbonateConstants } from './equilibrium-constants';

/** Result of {@link balanceCarbonate}; reused from call to call. */
export type CarbonateBalance = {
  /** [CO2(aq)], mol/L. */
  carbonDioxide: number;
  /** [HCO3-] + 2 [CO3--] + [CaHCO3+] + 2 [CaCO3], eq/L. */
  alkalinity: number;
  /** d alkalinity / d ln h at constant C_T and calcium, eq/L; never positive. */
  slope: number;
  /** Charge per carbon: d ln [CO2] / d ln h at constant totals, but for the few per cent in calcium pairs. */
  drift: number;
};

/** Positive root of a z^2 + b z = c with a, c >= 0, without losing digits to cancellation. */
function positiveRoot(a: number, b: number, c: number): number {
  if (c <= 0) return 0;
  const root = Math.sqrt(b * b + 4 * a * c);
  return b >= 0 ? (2 * c) / (b + root) : (root - b) / (2 * a);
}

/**
 * Carbonate species with the pairs CaHCO3+ and CaCO3(aq) at a given activity of H+.
 *
 * With z = [CO3--], [CO2] = s z, [HCO3-] = b z and q z the paired part per free calcium, the calcium balance gives
 * [Ca++] = calcium / (1 + q z) and C_T = z (s + b + 1) + q z calcium / (1 + q z): a quadratic in z.
 */
export function balanceCarbonate(
  h: number,
  inorganicCarbon: number,
  calcium: number,
  k: CarbonateConstants,
  out: CarbonateBalance,
): void {
  const ratio = h / k.carbonate;
  const s = h * ratio;
  const b = k.bicarbonate * ratio;
  const pairOne = k.calciumBicarbonate * b;
  const q = pairOne + k.calciumCarbonate;
  const d = s + b + 1;
  const z = positiveRoot(d * q, d + q * (calcium - inorganicCarbon), inorganicCarbon);
  const free = calcium / (1 + q * z);
  const carbonDioxide = s * z;
  const bicarbonate = b * z;
  const singlePair = free * pairOne * z;
  const doublePair = free * k.calciumCarbonate * z;
  const ofCarbon = bicarbonate + 2 * z + singlePair + 2 * doublePair;
  out.carbonDioxide = carbonDioxide;
  out.alkalinity = ofCarbon;
  if (inorganicCarbon <= 0) {
    out.slope = 0;
    out.drift = 0;
    return;
  }
  const charge = ofCarbon / inorganicCarbon;
  const squares = bicarbonate + 4 * z + singlePair + 4 * doublePair;
  const pairs = singlePair + doublePair;
  const shared = singlePair + 2 * doublePair - pairs * charge;
  const spread = calcium - (pairs * pairs) / inorganicCarbon;
  out.drift = charge;
  out.slope = ofCarbon * charge - squares + (spread > 0 ? (shared * shared) / spread : 0);
}

/** [CO3--] and [Ca++] in mol/L, and C_T, of a given carbonate alkalinity (eq/L, >= 0) at a given activity of H+. */
export type CarbonateSpecies = { carbonate: number; calcium: number; inorganicCarbon: number };

/**
 * The other way round: alkalinity = z (b + 2) + z (pairOne + 2 pairTwo) calcium / (1 + q z), again a quadratic in z.
 */
export function carbonateOfAlkalinity(
  h: number,
  alkalinity: number,
  calcium: number,
  k: CarbonateConstants,
): CarbonateSpecies {
  const s = (h * h) / k.carbonate;
  const b = (k.bicarbonate * h) / k.carbonate;
  const pairOne = k.calciumBicarbonate * b;
  const q = pairOne + k.calciumCarbonate;
  const paired = (pairOne + 2 * k.calciumCarbonate) * calcium;
  const z = positiveRoot((b + 2) * q, b + 2 + paired - q * alkalinity, alkalinity);
  const free = calcium / (1 + q * z);
  return { carbonate: z, calcium: free, inorganicCarbon: z * (s + b + 1 + q * free) };
}

/** Carbonate alkalinity (eq/L) and C_T when [CO2] is held at a value: closed form, for water in balance with the air. */
export function carbonateOfCarbonDioxide(
  h: number,
  carbonDioxide: number,
  calcium: number,
  k: CarbonateConstants,
): { alkalinity: number; inorganicCarbon: number } {
  const z = (carbonDioxide * k.carbonate) / (h * h);
  const b = (k.bicarbonate * h) / k.carbonate;
  const pairOne = k.calciumBicarbonate * b;
  const free = calcium / (1 + (pairOne + k.calciumCarbonate) * z);
  return {
    alkalinity: z * (b + 2 + (pairOne + 2 * k.calciumCarbonate) * free),
    inorganicCarbon: carbonDioxide + z * (b + 1 + (pairOne + k.calciumCarbonate) * free),
  };
}
