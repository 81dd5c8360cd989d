import type { ChlorineConstants } from './equilibrium-constants';

/** Result of {@link balanceChlorine}; reused from call to call so that a solver makes no garbage. */
export type ChlorineBalance = {
  /** [HOCl], mol/L. */
  hypochlorousAcid: number;
  /** [OCl-], mol/L. */
  hypochlorite: number;
  /** Alkalinity of OCl- and of all cyanurate ions, eq/L. */
  alkalinity: number;
  /** d alkalinity / d ln h at constant totals, eq/L; never positive. */
  slope: number;
  /** d ln [HOCl] / d ln h at constant totals: where to look for [HOCl] after a step in pH. */
  drift: number;
};

const MOST_STEPS = 200;

/** mol/L. */
const TRACE = 1e-25;

/** Newton doubles the right digits: a step this small (relative) leaves an error near its square. */
const LAST_STEP = 1e-6;

/**
 * [HOCl] from both mass balances. With D = p0 + p1 x + p2 x^2 + p3 x^3 (cyanurate carrying 0 to 3 chlorine, each over
 * [H3Cy]) the bound chlorine is cyanurate * x D'(x) / D(x), so
 *
 *   f x + cyanurate * x D'(x) / D(x) = chlorine,    f = 1 + [OCl-]/[HOCl]
 *
 * whose left side rises strictly with x from 0: there is one root, in (0, chlorine / f]. Newton, kept inside a bracket
 * that only shrinks; it bisects instead whenever a step would leave the bracket or is not half as long as the last.
 */
function solveHypochlorousAcid(
  chlorine: number,
  cyanurate: number,
  f: number,
  p0: number,
  p1: number,
  p2: number,
  p3: number,
  guess: number,
): number {
  let high = chlorine / f;
  if (cyanurate <= 0 || chlorine <= 0) return high;
  // So little that no cyanurate carries two: exact to the last digit, and the squares below would underflow.
  if (chlorine < TRACE) return (chlorine * p0) / (f * p0 + cyanurate * p1);
  let low = 0;
  let x = guess;
  if (!(x > low && x < high)) {
    // As if no cyanurate took a second chlorine: a quadratic, near the root in every ordinary pool.
    const linear = f * p0 + (cyanurate - chlorine) * p1;
    const root = Math.sqrt(linear * linear + 4 * f * p1 * chlorine * p0);
    x = linear >= 0 ? (2 * chlorine * p0) / (linear + root) : (root - linear) / (2 * f * p1);
    if (!(x < high)) x = high / 2;
  }
  let before = Infinity;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const one = p1 * x;
    const two = p2 * x * x;
    const three = p3 * x * x * x;
    const share = 1 / (p0 + one + two + three);
    const mean = (one + 2 * two + 3 * three) * share;
    const excess = f * x + cyanurate * mean - chlorine;
    if (excess > 0) high = x;
    else low = x;
    const steepness = f * x + cyanurate * ((one + 4 * two + 9 * three) * share - mean * mean);
    const towards = (x * excess) / steepness;
    const size = Math.abs(towards);
    const next = x - towards;
    if (size <= LAST_STEP * x) return next;
    if (next > low && next < high && size <= before / 2) {
      x = next;
      before = size;
    } else {
      x = low > 0 ? Math.sqrt(low * high) : 0.1 * high;
      before = high - low;
    }
  }
  return x;
}

/** [HOCl] alone, mol/L: all that speciation at a given pH needs. Arguments as in {@link balanceChlorine}. */
export function hypochlorousAcidAt(h: number, chlorine: number, cyanurate: number, k: ChlorineConstants): number {
  const r = 1 / h;
  const p0 = 1 + r * (k.none1 + r * (k.none2 + r * k.none3));
  const p1 = k.one0 + r * (k.one1 + r * k.one2);
  return solveHypochlorousAcid(chlorine, cyanurate, 1 + k.hypochlorite * r, p0, p1, k.two0 + k.two1 * r, k.three0, 0);
}

/**
 * Free chlorine and cyanurate at a given activity of H+, with what a solver for pH needs.
 * @param h activity of H+; @param chlorine total free chlorine, mol/L; @param cyanurate total cyanurate, mol/L.
 * @param guess [HOCl] to start from, mol/L; 0 when there is none.
 */
export function balanceChlorine(
  h: number,
  chlorine: number,
  cyanurate: number,
  k: ChlorineConstants,
  guess: number,
  out: ChlorineBalance,
): void {
  const r = 1 / h;
  const ratio = k.hypochlorite * r;
  const a1 = k.none1 * r;
  const a2 = k.none2 * r * r;
  const a3 = k.none3 * r * r * r;
  const b1 = k.one1 * r;
  const b2 = k.one2 * r * r;
  const c1 = k.two1 * r;
  const p0 = 1 + a1 + a2 + a3;
  const p1 = k.one0 + b1 + b2;
  const p2 = k.two0 + c1;
  const x = solveHypochlorousAcid(chlorine, cyanurate, 1 + ratio, p0, p1, p2, k.three0, guess);
  const hypochlorite = ratio * x;
  out.hypochlorousAcid = x;
  out.hypochlorite = hypochlorite;
  if (cyanurate <= 0) {
    out.alkalinity = hypochlorite;
    out.drift = ratio / (1 + ratio);
    out.slope = -hypochlorite / (1 + ratio);
    return;
  }
  // Sums over all species, weighted by charge given (a) and chlorine carried (l), then the two totals held constant.
  const xx = x * x;
  const y = cyanurate / (p0 + x * (p1 + x * (p2 + x * k.three0)));
  const chargeOne = y * x * (b1 + 2 * b2);
  const chargeTwo = y * xx * c1;
  const a = y * (a1 + 2 * a2 + 3 * a3) + chargeOne + chargeTwo;
  const aa = y * (a1 + 4 * a2 + 9 * a3) + y * x * (b1 + 4 * b2) + chargeTwo + hypochlorite;
  const l = y * x * (p1 + x * (2 * p2 + 3 * x * k.three0));
  const ll = y * x * (p1 + x * (4 * p2 + 9 * x * k.three0)) + x + hypochlorite;
  const la = chargeOne + 2 * chargeTwo + hypochlorite;
  out.alkalinity = a + hypochlorite;
  const charge = a / cyanurate;
  const shared = la - l * charge;
  const spread = ll - (l * l) / cyanurate;
  out.drift = spread > 0 ? shared / spread : 0;
  out.slope = a * charge - aa + shared * out.drift;
}
