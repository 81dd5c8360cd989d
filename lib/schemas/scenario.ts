import { z } from 'zod';
import { contradictionsOf } from './contradictions';
import { givenDoseSchema, plannedDoseSchema } from './dose';
import { poolSchema } from './pool';
import { posteriorSchema } from './posterior';
import { preferencesSchema } from './preferences';
import { readingSchema } from './reading';
import { shelfProductSchema } from './shelf-product';
import { instantSchema } from './time';
import { weekAheadSchema } from './week-ahead';
import { wishesSchema } from './wishes';

const positive = z.number().gt(0);

/** Overrides of what a pool can teach; anything left out has its default. Rates per hour. */
export const parametersSchema = z.strictObject({
  /** Loss of cyanurate-bound chlorine under the reference sun, k_B [1/h]. */
  boundPhotolysis: positive.max(1).optional(),
  /** Strength of the sun over this pool, lambda_sun [1]. */
  sunStrength: z.number().min(0).max(10).optional(),
  /** Dark demand at 27 degrees C, k_D [1/h]. */
  darkDemand: z.number().min(0).max(1).optional(),
  /** Chlorine used by one swimmer in an hour [g]. */
  chlorinePerSwimmerHour: z.number().min(0).max(50).optional(),
  /** Running hours that a 200 to 230 g tablet lasts [h]. */
  tabletLife: positive.max(2000).optional(),
  /** Water carried out by one swimmer in an hour [L]. */
  waterPerSwimmerHour: z.number().min(0).max(200).optional(),
  /** Leak [m3/day]. */
  leak: z.number().min(0).max(100).optional(),
  /** Speed at which CO2 leaves [m/h]. */
  carbonDioxideTransfer: z.number().min(0).max(1).optional(),
  /** Volume of the water [m3]. */
  volume: z.number().min(1).max(1000).optional(),
});
export type ParameterOverrides = z.output<typeof parametersSchema>;

const pricePerUnit = z.number().min(0).max(1e6);

/** What it costs later to undo one unit of drift, as the season sees it; in the currency of the prices. */
export const driftPricesSchema = z.strictObject({
  /** Per mg/L of stabilizer above where it is wanted. */
  stabilizer: pricePerUnit.optional(),
  /** Per mg/L of hardness above where it is wanted. */
  hardness: pricePerUnit.optional(),
  /** Per 0.1 of pH away from its aim. */
  pH: pricePerUnit.optional(),
});
export type DriftPrices = z.output<typeof driftPricesSchema>;

/** Everything a week's plan is made from. Unknown keys are a problem. */
export const scenarioSchema = z
  .strictObject({
    pool: poolSchema,
    reading: z.union([readingSchema, z.array(readingSchema).min(1).max(200)]),
    shelf: z.array(shelfProductSchema).max(50).default([]),
    week: weekAheadSchema.prefault({}),
    preferences: preferencesSchema.prefault({}),
    /** Nothing is planned before it; the newest reading's instant when left out. */
    now: instantSchema.optional(),
    given: z.array(givenDoseSchema).max(500).default([]),
    /** Doses to project, in the form of a plan's output; for projecting only. */
    doses: z
      .array(plannedDoseSchema.partial().required({ at: true, amount: true, unit: true }).loose())
      .max(200)
      .optional(),
    parameters: parametersSchema.prefault({}),
    /** What the pool has taught by its newest reading; takes the place of priors and of the bare reading. */
    posterior: posteriorSchema.optional(),
    driftPrices: driftPricesSchema.prefault({}),
    /** What the household changed of its plan; for planning only. */
    wishes: wishesSchema.optional(),
  })
  .superRefine(({ shelf, reading, now }, context) => {
    for (const contradiction of contradictionsOf(reading, now)) context.addIssue({ code: 'custom', ...contradiction });
    const seen = new Set<string>();
    shelf.forEach(({ id }, index) => {
      if (seen.has(id))
        context.addIssue({
          code: 'custom',
          path: ['shelf', index, 'id'],
          message: `Two products have the id "${id}".`,
        });
      seen.add(id);
    });
  });
export type Scenario = z.output<typeof scenarioSchema>;
export type ScenarioInput = z.input<typeof scenarioSchema>;
