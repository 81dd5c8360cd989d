import { z } from 'zod';
import { labelWays, shelfProductSchema } from './shelf-product';

const liquids: readonly string[] = ['sodium-hypochlorite', 'hydrochloric-acid'];
/** What is sold in many strengths: nothing is assumed, the label says. */
const strengthVaries: readonly string[] = [
  'trichlor',
  'dichlor',
  'calcium-hypochlorite',
  'sodium-hypochlorite',
  'hydrochloric-acid',
];

/** A product as the household keeps it: what the plan needs, and what the family calls it. */
export const householdProductSchema = shelfProductSchema
  .extend({
    /** What nobody was asked counts as what nobody could find. */
    labelWay: z.enum(labelWays).default('unknown'),
    name: z.string().trim().min(1, 'Write a name, or none.').max(80, 'Keep the name under 80 characters.').optional(),
  })
  .superRefine(({ form, substance, strength, tabletMass, boughtOn }, context) => {
    const problem = (path: string, message: string) => context.addIssue({ code: 'custom', path: [path], message });
    if (substance === 'other') return;
    if (liquids.includes(substance) !== (form === 'liquid'))
      problem('form', liquids.includes(substance) ? 'This one is a liquid.' : 'This one is not sold as a liquid.');
    if (strengthVaries.includes(substance) && strength === undefined)
      problem('strength', 'Copy the strength from the label.');
    if (form === 'tablet' && tabletMass === undefined) problem('tabletMass', 'Write what one tablet weighs.');
    if (substance === 'sodium-hypochlorite' && boughtOn === undefined)
      problem('boughtOn', 'Say when it was bought: liquid chlorine loses strength on the shelf.');
  });
export type HouseholdProduct = z.output<typeof householdProductSchema>;

export const householdProductListSchema = z.array(householdProductSchema);

/** What is left of a product, counted [g or mL]. */
export const stockCountSchema = z.strictObject({
  stock: z
    .number({ error: 'Write how much is left.' })
    .min(0, 'Write 0 or more.')
    .max(1e7, 'That is more than a shelf holds.'),
});

export const productPathSchema = z.strictObject({ productId: z.string().min(1).max(64) });
