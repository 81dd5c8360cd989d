import { ionicStrengthOf } from './activity';
import { balanceCarbonate, type CarbonateBalance } from './carbonate-balance';
import { balanceChlorine, type ChlorineBalance } from './chlorine-balance';
import { speciesAt } from './chlorine-species';
import { constantsAt, type EquilibriumConstants } from './equilibrium-constants';
import { CHLORINE_MILLIGRAMS_PER_MOLE } from './molar-masses';
import type { ChlorineSpecies, Ledger, ModelChoice } from './water';

/**
 * What a ledger is at equilibrium. An integrator keeps one and hands it back: each solve starts from the last.
 * Chlorine in mg/L as Cl2, carbon dioxide in mol/L.
 */
export type LedgerState = {
  pH: number;
  hypochlorousAcid: number;
  hypochlorite: number;
  cyanurateBound: number;
  carbonDioxide: number;
  /** [CO2] - [CO2] in equilibrium with air: what drives gas exchange. */
  carbonDioxideExcess: number;
};

/** A state to start from. */
export function newLedgerState(pH = 7.5): LedgerState {
  return {
    pH,
    hypochlorousAcid: 0,
    hypochlorite: 0,
    cyanurateBound: 0,
    carbonDioxide: 0,
    carbonDioxideExcess: 0,
  };
}

/** Wider than any water: the solver must not fail on a wild dose, only its caller may refuse the answer. */
export const LOWEST_PH = -2;
export const HIGHEST_PH = 16;
const MOST_STEPS = 200;

/** Newton doubles the right digits: a step of pH this small leaves an error near its square. */
const LAST_STEP = 1e-4;

// Working space of a solve, filled anew by each; nothing is carried from one call to the next.
const chlorine: ChlorineBalance = { hypochlorousAcid: 0, hypochlorite: 0, alkalinity: 0, slope: 0, drift: 0 };
const carbonate: CarbonateBalance = { carbonDioxide: 0, alkalinity: 0, slope: 0, drift: 0 };

/** The constants a ledger needs at its own temperature and dissolved solids. */
export function constantsOfLedger(ledger: Ledger, choice?: ModelChoice): EquilibriumConstants {
  return constantsAt(ledger.temperature, ionicStrengthOf(ledger.dissolvedSolids), choice);
}

/**
 * Solves a ledger for pH and writes the equilibrium into `state`; starts from the state's pH and HOCl.
 *
 * Root in pH of
 *   A = [HCO3-] + 2[CO3--] + [CaHCO3+] + 2[CaCO3] + [OH-] - [H+] + [OCl-] + [H2Cy-] + 2[HCy--] + 3[Cy---]
 *     + [HClCy-] + 2[ClCy--] + [Cl2Cy-] + [B(OH)4-]
 * whose right side rises strictly with pH at constant totals, so there is one root. Newton with the exact slope, kept
 * inside a bracket that only shrinks; it bisects instead whenever a step would leave the bracket or is not half as long
 * as the one before (between two buffers Newton can swing to and fro). Within 1e-8 of pH. No input check.
 */
export function solveLedger(ledger: Ledger, constants: EquilibriumConstants, state: LedgerState): void {
  const k = constants.carbonate;
  const totalChlorine = ledger.freeChlorine / CHLORINE_MILLIGRAMS_PER_MOLE;
  let low = LOWEST_PH;
  let high = HIGHEST_PH;
  let pH = state.pH;
  let acidGuess = state.hypochlorousAcid / CHLORINE_MILLIGRAMS_PER_MOLE;
  let change = 0;
  let before = Infinity;
  for (let step = 0; step < MOST_STEPS; step += 1) {
    const h = Math.exp(-Math.LN10 * pH);
    const r = 1 / h;
    balanceChlorine(h, totalChlorine, ledger.cyanurate, constants.chlorine, acidGuess, chlorine);
    balanceCarbonate(h, ledger.inorganicCarbon, ledger.calcium, k, carbonate);
    const hydroxide = k.hydroxide * r;
    const proton = k.proton * h;
    const borateShare = 1 / (1 + k.tetraborate * r);
    const tetraborate = ledger.borate * (1 - borateShare);
    const excess = carbonate.alkalinity + chlorine.alkalinity + hydroxide - proton + tetraborate - ledger.alkalinity;
    const slope = chlorine.slope + carbonate.slope - hydroxide - proton - tetraborate * borateShare;
    if (excess > 0) high = pH;
    else low = pH;
    const towards = excess / (slope * Math.LN10);
    const size = Math.abs(towards);
    const next = pH + towards;
    change = -Math.LN10 * towards;
    if (size <= LAST_STEP) {
      pH = next;
      break;
    }
    if (next > low && next < high && size <= before / 2) {
      pH = next;
      before = size;
      acidGuess = chlorine.hypochlorousAcid * (1 + change * chlorine.drift);
    } else {
      pH = (low + high) / 2;
      before = high - low;
      acidGuess = 0;
    }
  }
  // The balances stand at the pH before the last step: carry them along to first order.
  state.pH = pH;
  state.hypochlorousAcid = chlorine.hypochlorousAcid * (1 + change * chlorine.drift) * CHLORINE_MILLIGRAMS_PER_MOLE;
  state.hypochlorite = chlorine.hypochlorite * (1 + change * (chlorine.drift - 1)) * CHLORINE_MILLIGRAMS_PER_MOLE;
  state.cyanurateBound = Math.max(0, ledger.freeChlorine - state.hypochlorousAcid - state.hypochlorite);
  state.carbonDioxide = carbonate.carbonDioxide * (1 + change * carbonate.drift);
  state.carbonDioxideExcess = state.carbonDioxide - k.carbonDioxideInAir;
}

/**
 * pH of a ledger. Give a near `guess` and the constants when you hold them: two or three steps then do. No input check.
 */
export function pHOfLedger(ledger: Ledger, guess = 7.5, constants = constantsOfLedger(ledger)): number {
  const state = newLedgerState(guess);
  solveLedger(ledger, constants, state);
  return state.pH;
}

/** Free chlorine by form at a given pH, mg/L as Cl2. No input check. */
export function speciesOfLedger(ledger: Ledger, pH: number, constants = constantsOfLedger(ledger)): ChlorineSpecies {
  return speciesAt(pH, ledger.freeChlorine, ledger.cyanurate, constants.chlorine);
}

/** [CO2] - [CO2] in equilibrium with air (log pCO2 -3.38) at a given pH, mol/L. No input check. */
export function carbonDioxideExcess(ledger: Ledger, pH: number, constants = constantsOfLedger(ledger)): number {
  balanceCarbonate(Math.exp(-Math.LN10 * pH), ledger.inorganicCarbon, ledger.calcium, constants.carbonate, carbonate);
  return carbonate.carbonDioxide - constants.carbonate.carbonDioxideInAir;
}
