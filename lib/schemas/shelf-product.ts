import { z } from 'zod';
import { calendarDaySchema } from './time';

export const substances = [
  'trichlor',
  'dichlor',
  'calcium-hypochlorite',
  'sodium-hypochlorite',
  'hydrochloric-acid',
  'sodium-bisulfate',
  'sodium-bicarbonate',
  'sodium-carbonate',
  'calcium-chloride',
  'cyanuric-acid',
  'sodium-thiosulfate',
] as const;
export const productForms = ['tablet', 'granular', 'liquid', 'other'] as const;
export const labelWays = ['dissolve', 'broadcast', 'feeder-only', 'unknown'] as const;
export type ProductForm = (typeof productForms)[number];
export type LabelWay = (typeof labelWays)[number];

/**
 * A product by its active ingredient as printed. Solids: g and % available chlorine (or % by weight); liquids: mL and
 * trade % (hypochlorite) or % by weight (acid). Blends and anything else are 'other': kept, never planned.
 */
export const shelfProductSchema = z.strictObject({
  id: z.string().min(1).max(64),
  form: z.enum(productForms),
  substance: z.enum([...substances, 'other']),
  strength: z.number().gt(0, 'Copy the strength from the label.').max(100).optional(),
  /** Free alkali [% by weight]. */
  alkali: z.number().min(0).max(20).default(0),
  /** One tablet [g]. */
  tabletMass: z.number().min(1).max(1000).optional(),
  /** How its label says that it goes in; left out where nobody asked, 'unknown' where somebody could not find it. */
  labelWay: z.enum(labelWays).optional(),
  /** Whole measures: the marked measure kept for this product [g or mL]. */
  measure: z.number().gt(0).max(20000).optional(),
  pricePerKg: z.number().min(0).max(10000).optional(),
  pricePerLitre: z.number().min(0).max(10000).optional(),
  /** Left on the shelf [g or mL]. */
  stock: z.number().min(0).max(1e7).default(0),
  boughtOn: calendarDaySchema.optional(),
  /** Where it stands, mean temperature [degrees C]. */
  storedAt: z.number().min(-20).max(60).default(25),
});
export type ShelfProduct = z.output<typeof shelfProductSchema>;
