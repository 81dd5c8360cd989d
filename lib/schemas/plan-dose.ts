import { z } from 'zod';
import { plannedDoseSchema } from './dose';
import { labelWays } from './shelf-product';
import { instantSchema } from './time';

export const doseStatuses = ['planned', 'given', 'changed', 'skipped'] as const;
export type DoseStatus = (typeof doseStatuses)[number];

/** Which text the card shows: one for each way of handling a product (care rules, step texts). */
export const stepTexts = [
  'granules-dissolve',
  'granules-broadcast',
  /** Nobody has said what its label allows: no way of adding it is shown. */
  'granules-label-first',
  'liquid',
  'acid',
  'tablets-inline',
  'tablets-floating',
  'companion-dissolve',
] as const;

/** A dose of a stored plan, as it stands now. */
export const planDoseSchema = plannedDoseSchema.extend({
  id: z.uuid(),
  planId: z.uuid(),
  planVersion: z.number().int(),
  status: z.enum(doseStatuses),
  /** What the household calls the product; null when it has no name, or has to be bought. */
  productName: z.string().nullable(),
  labelWay: z.enum(labelWays).nullable(),
  /** The marked measure that the household keeps for the product [g or mL]. */
  measure: z.number().nullable(),
  steps: z.enum(stepTexts),
  /** From when it may be ticked, how long the pump must run, until when nobody swims. */
  tickFrom: instantSchema,
  pumpUntil: instantSchema.nullable(),
  waitUntil: instantSchema,
  givenAt: instantSchema.nullable(),
  givenAmount: z.number().nullable(),
  doneBy: z.string().nullable(),
  recordedBy: z.string().nullable(),
  /** Whole tablets that were found in the feeder before it; null where nobody said. */
  tabletsLeft: z.number().int().nullable(),
  /** Somebody says they are adding it right now. */
  claimedBy: z.string().nullable(),
  undoUntil: instantSchema.nullable(),
  /** Two people ticked it, and no test has seen the water since. */
  doubtful: z.boolean(),
  /** Whoever asks ticks doses, and has yet to confirm by name the Stop of its product. */
  stopDue: z.boolean(),
});
export type PlanDose = z.infer<typeof planDoseSchema>;

/** Whole tablets that were found in the feeder before new ones went in; only of a dose of tablets, and never asked twice. */
const tabletsLeftSchema = z
  .number()
  .int('Count whole tablets.')
  .min(0, 'Count whole tablets.')
  .max(50, 'No feeder holds that many. Count again.')
  .optional();

/** What a person says about a dose. The id of the tick is made on the device, so that a resend is the same tick. */
export const doseTickSchema = z.discriminatedUnion('action', [
  z.strictObject({ action: z.literal('claim'), id: z.uuid(), planVersion: z.number().int() }),
  z.strictObject({
    action: z.literal('given'),
    id: z.uuid(),
    planVersion: z.number().int(),
    at: instantSchema.optional(),
    tabletsLeft: tabletsLeftSchema,
  }),
  z.strictObject({
    action: z.literal('changed'),
    id: z.uuid(),
    planVersion: z.number().int(),
    at: instantSchema.optional(),
    tabletsLeft: tabletsLeftSchema,
    amount: z.number().gt(0, 'Write how much went in.').max(1e6),
  }),
  z.strictObject({ action: z.literal('skipped'), id: z.uuid(), planVersion: z.number().int() }),
  z.strictObject({ action: z.literal('undo'), id: z.uuid(), planVersion: z.number().int() }),
]);
export type DoseTick = z.infer<typeof doseTickSchema>;
