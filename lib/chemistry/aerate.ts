import { carbonateOfCarbonDioxide } from './carbonate-balance';
import { alkalinityWithoutCarbonate, analysisOf, ledgerOf } from './ledger';
import { constantsOfLedger, HIGHEST_PH, LOWEST_PH } from './solve-ledger';
import type { ModelChoice, WaterAnalysis } from './water';

/**
 * The water after all its carbon dioxide has come into balance with the air (log pCO2 -3.38 atm): alkalinity stays,
 * C_T follows, pH is where the ledger's alkalinity is met with [CO2] held at its value in air. The right side of that
 * balance rises strictly with pH; bisection to the last digit, for this is asked once and not in a loop.
 * @throws WaterRangeError outside the permitted ranges, or when alkalinity is too small for its pH.
 * Uncertainty: pH within 0.02 of the reference code. How *fast* water gets there is not known from it.
 */
export function aerateToEquilibrium(water: WaterAnalysis, choice?: ModelChoice): WaterAnalysis {
  const ledger = ledgerOf(water, choice);
  const constants = constantsOfLedger(ledger, choice);
  const k = constants.carbonate;
  let low = LOWEST_PH;
  let high = HIGHEST_PH;
  while (high - low > 1e-12) {
    const middle = (low + high) / 2;
    const h = Math.exp(-Math.LN10 * middle);
    const carbonate = carbonateOfCarbonDioxide(h, k.carbonDioxideInAir, ledger.calcium, k).alkalinity;
    if (carbonate + alkalinityWithoutCarbonate(ledger, h, constants) > ledger.alkalinity) high = middle;
    else low = middle;
  }
  const h = Math.exp(-Math.LN10 * low);
  ledger.inorganicCarbon = carbonateOfCarbonDioxide(h, k.carbonDioxideInAir, ledger.calcium, k).inorganicCarbon;
  return analysisOf(ledger, choice);
}
