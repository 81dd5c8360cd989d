import { analysisOf, ledgerOf } from './ledger';
import { CHLORINE_MILLIGRAMS_PER_MOLE } from './molar-masses';
import { requireAboveZero, requireInRange, type Range } from './ranges';
import { SUBSTANCES, type DoseContents, type Substance } from './substances';
import type { Ledger, ModelChoice, WaterAnalysis } from './water';

export type Dose = {
  substance: Substance;
  /** g; mL for sodium-hypochlorite and hydrochloric-acid. */
  amount: number;
  /**
   * Chlorine solids: % available chlorine; sodium-hypochlorite: trade % (g Cl2 per 100 mL); others % by weight.
   * Default: the pure substance, 12.5 for sodium-hypochlorite, 31.45 for hydrochloric-acid.
   */
  strength?: number;
  /** % by weight of free NaOH (liquid of 1.20 g/mL) or Ca(OH)2 (granules); default 0. */
  alkali?: number;
};

export type DosedProduct = Omit<Dose, 'amount'>;

/** Litres from a millilitre to a thousand cubic kilometres would all compute; this only keeps nonsense out. */
export const PERMITTED_VOLUME: Range = [1e-6, 1e6];
const PERMITTED_AMOUNT: Range = [0, 1e9];
const MOST_ALKALI = 30;

/** @throws WaterRangeError for a strength above pure, not above 0, or not finite; for alkali where the product has none. */
export function requireProduct(product: DosedProduct): void {
  const facts = SUBSTANCES[product.substance];
  if (product.strength !== undefined) {
    requireAboveZero('strength', product.strength, facts.pureStrength);
  }
  if (product.alkali !== undefined) {
    requireInRange('alkali', product.alkali, [0, facts.alkali === undefined ? 0 : MOST_ALKALI]);
  }
}

/** @throws WaterRangeError for an amount below 0 or not finite, and as {@link requireProduct}. */
export function requireDose(dose: Dose): void {
  requireProduct(dose);
  requireInRange('amount', dose.amount, PERMITTED_AMOUNT);
}

/** What one g (or mL) of a product brings: mol, eq and g per unit of amount. No input check. */
export function contentsPerUnit(product: DosedProduct): DoseContents {
  const facts = SUBSTANCES[product.substance];
  const contents = facts.contents(product.strength ?? facts.defaultStrength);
  if (facts.alkali === undefined || product.alkali === undefined || product.alkali === 0) return contents;
  return {
    ...contents,
    alkalinity: contents.alkalinity + product.alkali * facts.alkali.alkalinity,
    calcium: contents.calcium + product.alkali * facts.alkali.calcium,
    dissolvedSolids: contents.dissolvedSolids + product.alkali * facts.alkali.dissolvedSolids,
  };
}

/**
 * Adds `amount` units of a product with these contents to the ledger, in place: for an integrator that adds a little
 * every hour. `volume` m3, perfectly mixed, unchanged by the dose. A product that removes chlorine stops at 0, and
 * its acid with it. No input check.
 */
export function addContents(ledger: Ledger, volume: number, contents: DoseContents, amount: number): void {
  const perLitre = amount / (volume * 1000);
  let chlorine = contents.freeChlorine * perLitre;
  let alkalinity = contents.alkalinity * perLitre;
  if (chlorine < 0) {
    const present = ledger.freeChlorine / CHLORINE_MILLIGRAMS_PER_MOLE;
    if (-chlorine > present) {
      alkalinity *= present / -chlorine;
      chlorine = -present;
    }
  }
  ledger.freeChlorine = Math.max(0, ledger.freeChlorine + chlorine * CHLORINE_MILLIGRAMS_PER_MOLE);
  ledger.cyanurate += contents.cyanurate * perLitre;
  ledger.alkalinity += alkalinity;
  ledger.inorganicCarbon += contents.inorganicCarbon * perLitre;
  ledger.calcium += contents.calcium * perLitre;
  ledger.dissolvedSolids += contents.dissolvedSolids * perLitre * 1000;
}

/** The ledger after a dose into `volume` m3; the given one stays as it is. No input check. */
export function addDoseToLedger(ledger: Ledger, volume: number, dose: Dose): Ledger {
  const after = { ...ledger };
  addContents(after, volume, contentsPerUnit(dose), dose.amount);
  return after;
}

/**
 * The ledger after `amount` mg/L of chlorine (as Cl2) is used up, in place: HOCl -> H+ + Cl- + 1/2 O2. Never more than
 * there is. No input check.
 */
export function useUpInLedger(ledger: Ledger, amount: number): void {
  const used = Math.min(amount, ledger.freeChlorine);
  ledger.freeChlorine -= used;
  ledger.alkalinity -= used / CHLORINE_MILLIGRAMS_PER_MOLE;
}

/**
 * The water after one dose, perfectly mixed, without gas exchange or precipitation; the volume stays.
 *
 * Stoichiometry per mol: HCl A-1, NaHSO4 A-1, NaHCO3 A+1 C_T+1, Na2CO3 A+2 C_T+1, NaOCl A+1 FC+1, NaOH A+1,
 * Ca(OCl)2 A+2 FC+2 Ca+1, Ca(OH)2 A+2 Ca+1, trichlor FC+3 Cy+1, dichlor A+1 FC+2 Cy+1, cyanuric acid Cy+1,
 * CaCl2 Ca+1. Sodium thiosulfate removes 1 mg/L of free chlorine per 1.9 mg/L (pentahydrate; field value, published
 * stoichiometries differ eightfold), never below 0, and leaves combined chlorine alone. pH is then solved.
 *
 * @param volume m3.
 * @throws WaterRangeError for water, volume, amount, strength or alkali outside what is permitted, and when the dose
 *   drives pH outside 0 to 14. A result outside the ranges permitted for readings is extrapolated.
 * Uncertainty: pH within 0.015 of the reference code; the household's volume and product strength weigh far more.
 */
export function addDose(water: WaterAnalysis, volume: number, dose: Dose, choice?: ModelChoice): WaterAnalysis {
  requireDose(dose);
  requireInRange('volume', volume, PERMITTED_VOLUME);
  return analysisOf(addDoseToLedger(ledgerOf(water, choice), volume, dose), choice);
}

/**
 * The water after `amount` mg/L of free chlorine (as Cl2) is used up by sunlight or oxidation, closed to gas exchange:
 * one equivalent of acid per mol. Oxidation of ammonia or urea makes a little more acid than that.
 * @throws WaterRangeError when there is not that much, or the water is outside the permitted ranges.
 */
export function useUpChlorine(water: WaterAnalysis, amount: number, choice?: ModelChoice): WaterAnalysis {
  const ledger = ledgerOf(water, choice);
  // Chlorine dosed and then used up comes back rounded: the last nanogram is not an error.
  if (!(amount >= 0 && amount <= water.freeChlorine + 1e-9)) requireInRange('amount', amount, [0, water.freeChlorine]);
  useUpInLedger(ledger, amount);
  return analysisOf(ledger, choice);
}
