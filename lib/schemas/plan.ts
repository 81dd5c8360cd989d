import { z } from 'zod';
import { plannedDoseSchema } from './dose';
import { instantSchema } from './time';

const hourly = z.array(z.number());
export const bandSchema = z.object({ p10: hourly, p50: hourly, p90: hourly });
export type Band = z.infer<typeof bandSchema>;

/** A code and its numbers, worded in the interface. */
export const factSchema = z.looseObject({ code: z.string() });
export type Fact = { code: string; [figure: string]: string | number | boolean | null };

export const waterAnalysisSchema = z.object({
  freeChlorine: z.number(),
  combinedChlorine: z.number().optional(),
  pH: z.number(),
  totalAlkalinity: z.number(),
  calciumHardness: z.number(),
  cyanuricAcid: z.number(),
  temperature: z.number(),
  dissolvedSolids: z.number().optional(),
  borate: z.number().optional(),
});

export const projectionSchema = z.object({
  freeChlorine: bandSchema.extend({ lowestLevel: hourly, swimLimit: hourly }),
  pH: bandSchema,
  cyanuricAcid: bandSchema,
  median: z.object({
    freeChlorine: hourly,
    pH: hourly,
    cyanuricAcid: hourly,
    calciumHardness: hourly,
    totalAlkalinity: hourly,
  }),
});
export type PlanProjection = z.infer<typeof projectionSchema>;

export const checkSchema = z.object({ at: instantSchema, kind: z.enum(['quick', 'full']), reason: z.string() });

/** Money and penalties, weighted, in the currency of the prices; they add up to the total. */
export const costSchema = z.object({
  money: z.number(),
  visits: z.number(),
  shortfall: z.number(),
  excess: z.number(),
  stabilizer: z.number(),
  hardness: z.number(),
  pH: z.number(),
  total: z.number(),
});
export type Cost = z.infer<typeof costSchema>;

/** What a way of getting through the week asks of the household and leaves in the water. */
export const burdenSchema = z.object({
  money: z.number(),
  visits: z.number(),
  /** Mean difference of a day's highest and lowest free chlorine [mg/L]. */
  swing: z.number(),
  /** Change over the week [mg/L]. */
  stabilizer: z.number(),
  hardness: z.number(),
  /** Weight to carry [kg]. */
  kilograms: z.number(),
  hoursOutside: z.number(),
});
export type Burden = z.infer<typeof burdenSchema>;

export const alternativeSchema = burdenSchema.extend({
  kind: z.enum(['tablets', 'granular', 'liquid']),
  feasible: z.boolean(),
  doses: z.array(plannedDoseSchema),
  total: z.number(),
});
export type Alternative = z.infer<typeof alternativeSchema>;

export const brokenSchema = z.object({
  limit: z.string(),
  at: instantSchema,
  value: z.number(),
  bound: z.number(),
  unit: z.string(),
});
export type BrokenLimit = z.infer<typeof brokenSchema>;

/** What a plan lacks: a measured quantity, and since when it has not been measured. */
export const needSchema = z.object({ code: z.string(), quantity: z.string(), since: z.string().nullable() });

export const weekPlanSchema = z.object({
  engineVersion: z.string(),
  takenAt: instantSchema,
  hours: z.array(instantSchema),
  projection: projectionSchema.nullable(),
  doses: z.array(plannedDoseSchema),
  checks: z.array(checkSchema),
  endOfWeek: waterAnalysisSchema.nullable(),
  cost: costSchema.nullable(),
  /** The plan's own burdens, beside those of each form alone. */
  mix: burdenSchema.nullable().default(null),
  alternatives: z.array(alternativeSchema),
  openSwimShare: z.number().nullable(),
  broken: z.array(brokenSchema),
  reasons: z.array(factSchema),
  cautions: z.array(factSchema),
  needs: z.array(needSchema),
});
export type WeekPlan = z.infer<typeof weekPlanSchema>;
