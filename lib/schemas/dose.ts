import { z } from 'zod';
import { productForms, substances } from './shelf-product';
import { instantSchema } from './time';

export const doseUnits = ['tablet', 'g', 'mL'] as const;
export type DoseUnit = (typeof doseUnits)[number];

/** A dose that went in: fixed history. */
export const givenDoseSchema = z.strictObject({
  at: instantSchema,
  product: z.string().min(1).max(64),
  amount: z.number().gt(0).max(1e6),
  unit: z.enum(doseUnits),
});
export type GivenDose = z.infer<typeof givenDoseSchema>;

/** A dose of a plan. */
export const plannedDoseSchema = z.object({
  at: instantSchema,
  /** Shelf id, or null when it has to be bought. */
  product: z.string().nullable(),
  toBuy: z.boolean(),
  substance: z.enum(substances),
  form: z.enum(productForms),
  amount: z.number().gt(0).max(1e6),
  unit: z.enum(doseUnits),
  /** Free chlorine it adds [mg/L]; tablets: over the whole of their life. */
  rise: z.number(),
  /** What a companion moves, and by how much. */
  effect: z
    .object({ quantity: z.enum(['pH', 'totalAlkalinity', 'calciumHardness', 'cyanuricAcid']), change: z.number() })
    .optional(),
  reason: z.string(),
});
export type PlannedDose = z.infer<typeof plannedDoseSchema>;
