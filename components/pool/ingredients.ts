import type { ProductForm, substances } from '@/lib/schemas/shelf-product';

export type Ingredient = (typeof substances)[number] | 'other';

type IngredientFacts = {
  /** The forms in which it is sold; one of them needs no question. */
  forms: readonly ProductForm[];
  /** What the label prints: available chlorine, the ways of a liquid, per cent by weight, or nothing that matters. */
  strength: 'available-chlorine' | 'liquid-chlorine' | 'by-weight' | 'none';
  /** How it goes in is asked as the label says it, without a default. */
  asksLabelWay: boolean;
};

/** Active ingredients as labels print them, those of chlorine first. The words stand in the messages. */
const ingredients = {
  trichlor: { forms: ['tablet', 'granular'], strength: 'available-chlorine', asksLabelWay: true },
  'calcium-hypochlorite': { forms: ['granular', 'tablet'], strength: 'available-chlorine', asksLabelWay: true },
  'sodium-hypochlorite': { forms: ['liquid'], strength: 'liquid-chlorine', asksLabelWay: false },
  dichlor: { forms: ['granular', 'tablet'], strength: 'available-chlorine', asksLabelWay: true },
  'hydrochloric-acid': { forms: ['liquid'], strength: 'by-weight', asksLabelWay: false },
  'sodium-bisulfate': { forms: ['granular'], strength: 'by-weight', asksLabelWay: false },
  'sodium-bicarbonate': { forms: ['granular'], strength: 'none', asksLabelWay: false },
  'sodium-carbonate': { forms: ['granular'], strength: 'none', asksLabelWay: false },
  'calcium-chloride': { forms: ['granular'], strength: 'by-weight', asksLabelWay: false },
  'cyanuric-acid': { forms: ['granular'], strength: 'none', asksLabelWay: false },
  'sodium-thiosulfate': { forms: ['granular'], strength: 'none', asksLabelWay: false },
  other: { forms: ['other'], strength: 'none', asksLabelWay: false },
} as const satisfies Record<Ingredient, IngredientFacts>;

export const ingredientNames = Object.keys(ingredients) as Ingredient[];

export function factsOf(ingredient: Ingredient): IngredientFacts {
  return ingredients[ingredient];
}
