import type { PlannedDose } from '@/lib/schemas/dose';
import { type ShelfProduct, substances } from '@/lib/schemas/shelf-product';
import { tabletFacts } from './product-facts';

/** What somebody may be told to buy, by its active ingredient. */
export type PurchaseSubstance = (typeof substances)[number];

/** Whether a week needs something to be bought. Amounts in g, of liquids in mL. */
export type Purchase = {
  substance: PurchaseSubstance;
  answer: 'needed' | 'have-enough' | 'not-this-week';
  /** What the doses ahead take in all, and how many tablets that is where they are tablets. */
  needed: number;
  tablets: number;
  /** What is left of it: of the products that the doses come from; where the week has none, of all. */
  inStock: number;
  unit: 'g' | 'mL';
  /** It is or brings stabilizer, and stabilizer was never measured. */
  testFirst: boolean;
};

type Week = {
  /** Doses of the plan that are still to come. */
  doses: readonly PlannedDose[];
  shelf: readonly Pick<ShelfProduct, 'id' | 'form' | 'substance' | 'stock' | 'tabletMass' | 'strength'>[];
  /** What the plan lacks. */
  needs: readonly { quantity: string }[];
};

/**
 * What of everything that a shop sells this week takes, for each substance that Wadewell plans.
 *
 * needed = sum over the doses ahead of a substance, a tablet counted by its mass; in stock = sum over the products that
 * those doses come from. A dose of a product that is not on the shelf draws on no stock, however much stands there in
 * another form or with a label that does not let it be planned. A substance is `needed` as soon as one of its doses is
 * marked to buy or a product holds less than its doses take; `have-enough` when the shelf covers them; `not-this-week`
 * when no dose takes it. It says nothing about the weeks after.
 *
 * Units: g, liquids mL. Errors: none. Exact for the plan it is given.
 */
export function purchasesOf(week: Week): Purchase[] {
  return substances.map((substance) => purchaseOf(substance, week));
}

function purchaseOf(substance: PurchaseSubstance, { doses, shelf, needs }: Week): Purchase {
  const ofSubstance = doses.filter((dose) => dose.substance === substance);
  const held = shelf.filter((product) => product.substance === substance);
  const massOf = ({ product, unit, amount }: PlannedDose) =>
    unit === 'tablet' ? amount * tabletFacts(held.find(({ id }) => id === product) ?? {}).tabletMass : amount;
  const sum = (of: readonly PlannedDose[]) => of.reduce((total, dose) => total + massOf(dose), 0);
  const sources = held.filter(({ id }) => ofSubstance.some(({ product }) => product === id));
  const short = sources.some(
    ({ id, stock }) => sum(ofSubstance.filter(({ product }) => product === id)) > stock + 1e-9,
  );
  const mustBuy = short || ofSubstance.some(({ toBuy }) => toBuy);
  return {
    substance,
    answer: ofSubstance.length === 0 ? 'not-this-week' : mustBuy ? 'needed' : 'have-enough',
    needed: sum(ofSubstance),
    tablets: ofSubstance.reduce((count, { unit, amount }) => count + (unit === 'tablet' ? amount : 0), 0),
    inStock: (ofSubstance.length === 0 ? held : sources).reduce((total, { stock }) => total + stock, 0),
    unit: isLiquid(substance) ? 'mL' : 'g',
    testFirst: stabilizing.includes(substance) && needs.some(({ quantity }) => quantity === 'cyanuricAcid'),
  };
}

/** What carries or is stabilizer: whether the water lacks it, or has too much, only a test of it tells. */
const stabilizing: readonly PurchaseSubstance[] = ['trichlor', 'dichlor', 'cyanuric-acid'];

function isLiquid(substance: PurchaseSubstance): boolean {
  return substance === 'sodium-hypochlorite' || substance === 'hydrochloric-acid';
}
