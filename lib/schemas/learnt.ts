import { z } from 'zod';
import { learnableParameters, uncertainQuantities } from './posterior';
import { instantSchema } from './time';

/** What a pool teaches, as people ask for it: the first four on their own, the rest folded away. */
export const learntThings = ['dailyLoss', ...learnableParameters] as const;
export type LearntThing = (typeof learntThings)[number];

/** Units in which each is kept; which one a household reads is the page's matter. */
export const learntUnits = [
  'mg/L',
  'm3',
  'days',
  'g',
  'L',
  'percent',
  'percent-per-hour',
  'percent-per-day',
  'cm-per-hour',
] as const;

const rangeSchema = z.object({ p10: z.number(), p50: z.number(), p90: z.number() });
export type LearntRange = z.infer<typeof rangeSchema>;

const learntRowSchema = z.object({
  thing: z.enum(learntThings),
  unit: z.enum(learntUnits),
  /** What pools like this one are like, 8 in 10. */
  before: rangeSchema,
  /** What this one is like, 8 times in 10. */
  learnt: rangeSchema,
  /** How many tests made it clearer. */
  readings: z.number().int().min(0),
  clear: z.boolean(),
});
export type LearntRow = z.infer<typeof learntRowSchema>;

/** A test, or a look into the feeder, that did not simply count. */
const stoodOutSchema = z.object({
  takenAt: instantSchema,
  kind: z.enum(['questioned', 'believed', 'unrecorded-dose']),
  quantity: z.enum([...uncertainQuantities, 'tabletsLeft']),
  measured: z.number(),
  low: z.number(),
  high: z.number(),
});
export type StoodOut = z.infer<typeof stoodOutSchema>;

/** What the pool has taught so far. */
export const learntSchema = z.object({
  /** Since when an owner wants it learnt; null for all that is recorded. */
  since: instantSchema.nullable(),
  /** Tests that it was learnt from. */
  readings: z.number().int().min(0),
  rows: z.array(learntRowSchema),
  /** Hours a day that water passes the tablets; null where none are used. */
  tabletHoursADay: z.number().nullable(),
  /** [m3] */
  enteredVolume: z.number().nullable(),
  /** The volume of the tests lies further from the entered one than it may be used. */
  measureVolumeAgain: z.boolean(),
  /** Newest first. */
  stoodOut: z.array(stoodOutSchema),
});
export type Learnt = z.infer<typeof learntSchema>;
