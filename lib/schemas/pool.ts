import { z } from 'zod';
import { limits } from '@/lib/standards/limits';
import { timeZoneSchema, wallIntervalSchema } from './time';

export const surfaces = ['plaster', 'vinyl', 'fibreglass', 'tile', 'painted'] as const;
export const covers = ['none', 'floating', 'opaque'] as const;
export const feederKinds = ['none', 'inline', 'floating'] as const;
export const feederIngredients = ['trichlor', 'dichlor', 'calcium-hypochlorite', 'other'] as const;
export type Surface = (typeof surfaces)[number];

export const fillWaterSchema = z.strictObject({
  calciumHardness: z.number().min(0).max(2000).default(60),
  totalAlkalinity: z.number().min(0).max(1000).default(80),
  pH: z.number().min(5).max(10.5).default(7.6),
  dissolvedSolids: z.number().min(0).max(30000).default(300),
});

export const feederSchema = z.strictObject({
  kind: z.enum(feederKinds).default('none'),
  ingredient: z.enum(feederIngredients).optional(),
  /** How many tablets it holds. */
  capacity: z.number().int().min(0).max(60).default(0),
  /** Tablet mass still in it [g]. */
  loaded: z.number().min(0).max(20000).default(0),
});

/** The pool as the engine sees it: m3, m, mg/L, degrees, wall times of its time zone. */
export const poolSchema = z.strictObject({
  volume: z
    .number()
    .min(1, 'A pool of 1 to 1000 m3 can be planned.')
    .max(1000, 'A pool of 1 to 1000 m3 can be planned.'),
  /** Whether the volume was only estimated: then the first dose is halved and the water tested again. */
  volumeEstimated: z.boolean().default(false),
  meanDepth: z.number().min(0.2).max(6).default(1.5),
  surface: z.enum(surfaces).default('plaster'),
  latitude: z.number().min(-90).max(90),
  longitude: z.number().min(-180).max(180),
  timeZone: timeZoneSchema,
  /** Share of the sun that reaches the water, not shaded by house or trees. */
  sunExposure: z.number().min(0).max(1).default(1),
  cover: z.enum(covers).default('none'),
  waterFeatures: z.boolean().default(false),
  fillWater: fillWaterSchema.prefault({}),
  /** When the pump runs, local wall clock; an interval may cross midnight; empty means never. */
  pump: z
    .array(wallIntervalSchema)
    .max(12)
    .default([{ from: '08:00', to: '16:00' }]),
  feeder: feederSchema.prefault({}),
  swimHours: wallIntervalSchema.default({ from: '10:00', to: '20:00' }),
  /** Where stabilizer is kept [mg/L]. */
  stabilizerBand: z
    .tuple([z.number().min(0).max(100), z.number().min(0).max(100)])
    .refine(([low, high]) => low < high, 'The lower end comes first.')
    .default([30, 60]),
  /** Free chlorine above which nobody swims [mg/L], from the label. */
  swimLimit: z.number().min(2).max(limits.swimLimitHighest.value).default(limits.swimLimitDefault.value),
});
export type Pool = z.output<typeof poolSchema>;
