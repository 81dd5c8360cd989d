import { z } from 'zod';
import { doseUnits } from './dose';
import { productForms, substances } from './shelf-product';
import { calendarDaySchema, instantSchema } from './time';

/** What made a plan be made anew. */
export const changeCauses = [
  'new-reading',
  'dose',
  'week-ahead',
  'pool',
  'shelf',
  'preferences',
  'try-out',
  'learning',
  'engine',
] as const;
export type ChangeCause = (typeof changeCauses)[number];

/** One dose ahead that the newest plan has otherwise than the one before; null where one of them has none. */
const changedDoseSchema = z.object({
  day: calendarDaySchema,
  substance: z.enum(substances),
  form: z.enum(productForms),
  unit: z.enum(doseUnits),
  before: z.number().nullable(),
  after: z.number().nullable(),
});

/** What the newest plan changed of the days ahead, and why. */
export const planChangesSchema = z.object({
  at: instantSchema,
  causes: z.array(z.enum(changeCauses)).min(1),
  doses: z.array(changedDoseSchema).min(1),
});
export type PlanChanges = z.infer<typeof planChangesSchema>;
