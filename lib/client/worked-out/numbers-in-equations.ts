import { PER_WIND, QUIET_POOL, STILL_AIR } from '@/lib/projection/evaporation';
import { ENSEMBLE_SIZE } from '@/lib/projection/ensemble';
import { parametersOf } from '@/lib/projection/parameters';
import { holdRates, newStepRates, noRelease, SHARE_BECOMING_COMBINED } from '@/lib/projection/step';
import { limits } from '@/lib/standards/limits';
import { REFERENCE_ELEVATION, ULTRAVIOLET_EXPONENT } from '@/lib/sun/ultraviolet';

/** The temperature [degrees C] at which dark demand is its parameter, found where the two are equal. */
function darkDemandAt(): number {
  const parameters = parametersOf({ volume: 1, waterFeatures: false });
  const acting = { sun: 0, covered: 0, evaporation: 0, rain: 0, swimmers: 0, temperature: 0 };
  const rates = newStepRates();
  holdRates(rates, acting, noRelease, parameters, { depth: 1, light: 0 });
  return Math.round(10 * Math.log2(parameters.darkDemand / rates.darkDemand));
}

/** What stands as a figure in an equation of the help pages, taken from the code that computes with it. */
export const numbersInEquations = {
  darkDemandAt: darkDemandAt(),
  stabilizerPerLowestLevel: limits.stabilizerPerLowestLevel.value,
  minimumStabilized: limits.codeMinimumStabilized.value,
  minimumUnstabilized: limits.codeMinimumUnstabilized.value,
  referenceElevation: REFERENCE_ELEVATION,
  ultravioletExponent: ULTRAVIOLET_EXPONENT,
  becomingCombined: SHARE_BECOMING_COMBINED,
  pools: ENSEMBLE_SIZE,
  quietPool: QUIET_POOL,
  stillAir: STILL_AIR,
  perWind: PER_WIND,
};
