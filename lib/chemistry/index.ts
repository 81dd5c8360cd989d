/** The water model's contract (design/engine.md, section 1). */
export { UnreachableTargetError, WaterRangeError } from '@/lib/errors';

export type { ChlorineSpecies, Ledger, ModelChoice, WaterAnalysis } from './water';
export type { DoseContents, Substance } from './substances';
export type { Dose, DosedProduct } from './dose';
export type { Target } from './amount-to-reach';

export { chlorineSpecies } from './chlorine-species';
export { saturationIndex, langelierIndex } from './saturation';
export { ledgerOf, analysisOf } from './ledger';
export { addDose, useUpChlorine } from './dose';
export { aerateToEquilibrium } from './aerate';
export { amountToReach } from './amount-to-reach';
export { storedHypochloriteStrength } from './hypochlorite-decay';
export { PERMITTED } from './ranges';
export { SUBSTANCES } from './substances';

// For an integrator: no input checks, little garbage.
export type { ChlorineConstants, CarbonateConstants, EquilibriumConstants } from './equilibrium-constants';
export type { LedgerState } from './solve-ledger';
export { constantsAt } from './equilibrium-constants';
export { ionicStrengthOf } from './activity';
export {
  carbonDioxideExcess,
  constantsOfLedger,
  newLedgerState,
  pHOfLedger,
  solveLedger,
  speciesOfLedger,
} from './solve-ledger';
export { addContents, addDoseToLedger, contentsPerUnit, useUpInLedger } from './dose';
