import { z } from 'zod';
import { covers, feederIngredients, feederKinds, surfaces } from './pool';
import { readingMethods } from './reading-kinds';
import { knownTimeZoneSchema } from './account';
import { wallIntervalSchema } from './time';
import { poolSizeSchema } from './pool-size';

/** The parts of the first run in their order: scope, five short steps, and what the label says. */
export const setupSteps = ['scope', 'size', 'lining', 'sun', 'water', 'shelf', 'label'] as const;
export type SetupStep = (typeof setupSteps)[number];

export const waterSystems = ['chlorine', 'salt-generator', 'bromine', 'biguanide', 'copper-silver', 'unknown'] as const;
export const poolKinds = ['pool', 'pool-with-spa', 'hot-tub'] as const;
/** 'unsure' is treated as plaster, the careful way. */
export const surfaceAnswers = [...surfaces, 'unsure'] as const;

const yesOrNo = z.boolean({ error: 'Answer yes or no.' });

/** What decides whether Wadewell can help at all (care rules, part 1), and who may handle chemicals. */
export const scopeAnswersSchema = z.strictObject({
  system: z.enum(waterSystems, { error: 'Choose what keeps the pool clean.' }),
  kind: z.enum(poolKinds, { error: 'Choose what it is: a pool, a pool with a spa, or a hot tub.' }),
  roofed: yesOrNo,
  /** Plaster under 30 days old, or fresh paint. */
  newSurface: yesOrNo,
  /** Rented to guests, a club, a school, or shared by several families. */
  openToPublic: yesOrNo,
  planted: yesOrNo,
  ultravioletOrOzone: yesOrNo,
  wellWater: yesOrNo,
  copperHeater: yesOrNo,
  /** Whether the person who answers is the adult who handles chemicals and has read the safety card. */
  handlesChemicals: yesOrNo,
});
export type ScopeAnswers = z.output<typeof scopeAnswersSchema>;

export const liningSchema = z.strictObject({
  surface: z.enum(surfaceAnswers, { error: 'Choose what the pool is lined with, or "not sure".' }),
});

const degrees = (most: number, which: string) =>
  z
    .number({ error: `Write the ${which} in degrees, or choose a town.` })
    .min(-most, `A ${which} lies between -${most} and ${most} degrees.`)
    .max(most, `A ${which} lies between -${most} and ${most} degrees.`);

export const sunAndPlaceSchema = z.strictObject({
  /** Nearest town, as the person knows it; never an address. */
  placeName: z.string().trim().max(80, 'Keep the name of the town under 80 characters.').optional(),
  latitude: degrees(90, 'latitude'),
  longitude: degrees(180, 'longitude'),
  timeZone: knownTimeZoneSchema,
  sunExposure: z.number({ error: 'Say how much sun the pool gets.' }).min(0).max(1),
  cover: z.enum(covers, { error: 'Say which cover the pool has, or none.' }),
  waterFeatures: yesOrNo,
});

/** Left out means not known: the usual figure is taken, and said so. */
export const fillWaterAnswersSchema = z.strictObject({
  calciumHardness: z.number().min(0).max(2000).optional(),
  totalAlkalinity: z.number().min(0).max(1000).optional(),
  pH: z.number().min(5).max(10.5).optional(),
  dissolvedSolids: z.number().min(0).max(30000).optional(),
});

export const feederAnswersSchema = z
  .strictObject({
    kind: z.enum(feederKinds, { error: 'Say where slow tablets go: a feeder, a floater, or nothing yet.' }),
    ingredient: z
      .enum(feederIngredients, { error: 'Copy the active ingredient from the label of the feeder.' })
      .optional(),
    capacity: z
      .number({ error: 'Write how many tablets it holds.' })
      .int('Count whole tablets.')
      .min(0, 'Write 0 or more.')
      .max(60, 'A feeder holds 60 tablets at most.')
      .default(0),
    /** Tablet mass still in it [g]. */
    loaded: z.number().min(0, 'Write 0 or more.').max(20000).default(0),
  })
  .superRefine(({ kind, ingredient, capacity }, context) => {
    if (kind === 'none') return;
    if (ingredient === undefined)
      context.addIssue({
        code: 'custom',
        path: ['ingredient'],
        message: 'Copy the active ingredient from the label of the feeder: only the same one may go in.',
      });
    if (capacity < 1)
      context.addIssue({ code: 'custom', path: ['capacity'], message: 'Write how many tablets it holds.' });
  });

export const waterAndEquipmentSchema = z.strictObject({
  /** When the pump runs, local wall clock; empty means never. */
  pump: z.array(wallIntervalSchema).max(12, 'Twelve running times a day are enough.'),
  feeder: feederAnswersSchema,
  fillWater: fillWaterAnswersSchema,
  testMethods: z.array(z.enum(readingMethods)).min(1, 'Choose how you test: strips, a drop kit or a shop slip.').max(3),
});

/** What the label of the chlorine says about swimming again [mg/L]. */
export const labelSwimLimits = [4, 5, 10] as const;

export const labelAnswersSchema = z.strictObject({
  swimLimit: z.union([z.literal([...labelSwimLimits]), z.literal('not-said')], {
    error: 'Choose what the label says: 4, 5, 10 mg/L, or that it does not say.',
  }),
  swimHours: wallIntervalSchema.refine(({ from, to }) => from < to, {
    path: ['to'],
    message: 'Swimming ends after it begins, on the same day.',
  }),
});

/** One saved part of the profile. The shelf has its own list, so its part only says "that is all there is". */
export const setupAnswerSchema = z.discriminatedUnion(
  'step',
  [
    z.strictObject({ step: z.literal('scope'), answers: scopeAnswersSchema }),
    z.strictObject({ step: z.literal('size'), answers: poolSizeSchema }),
    z.strictObject({ step: z.literal('lining'), answers: liningSchema }),
    z.strictObject({ step: z.literal('sun'), answers: sunAndPlaceSchema }),
    z.strictObject({ step: z.literal('water'), answers: waterAndEquipmentSchema }),
    z.strictObject({ step: z.literal('shelf') }),
    z.strictObject({ step: z.literal('label'), answers: labelAnswersSchema }),
  ],
  { error: 'Say which part of the profile this is.' },
);
export type SetupAnswer = z.output<typeof setupAnswerSchema>;

export const scopeResults = ['ok', 'record-only', 'stop'] as const;
export const scopeReasons = [
  'bromine',
  'biguanide',
  'copper-silver',
  'unknown-system',
  'hot-tub',
  'roofed',
  'new-surface',
  'open-to-public',
  'planted',
  'under-2-cubic-metres',
  'salt-generator',
  'under-10-cubic-metres',
] as const;
export const scopeNotes = ['spa-counts-in-volume', 'metal-test-first'] as const;

/** What the answers so far mean for this pool; reasons and notes are worded in the interface. */
export const scopeSchema = z.object({
  result: z.enum(scopeResults),
  reasons: z.array(z.enum(scopeReasons)),
  notes: z.array(z.enum(scopeNotes)),
});
export type Scope = z.output<typeof scopeSchema>;

/** Everything answered so far; a part that was not reached is null. */
export const poolProfileSchema = z.object({
  scope: scopeAnswersSchema.nullable(),
  size: poolSizeSchema.nullable(),
  /** Worked out from the size [m3, m]. */
  volume: z.number().nullable(),
  meanDepth: z.number().nullable(),
  volumeEstimated: z.boolean().nullable(),
  lining: liningSchema.nullable(),
  sun: sunAndPlaceSchema.nullable(),
  water: waterAndEquipmentSchema.nullable(),
  label: labelAnswersSchema.nullable(),
  /** Name of the person who set the swim limit. */
  swimLimitSetBy: z.string().nullable(),
});
export type PoolProfile = z.output<typeof poolProfileSchema>;

/** Where the first run stands. */
export const setupStateSchema = z.object({
  /** The next part to answer; null when all are answered. */
  nextStep: z.enum(setupSteps).nullable(),
  completed: z.boolean(),
  recordOnly: z.boolean(),
  decision: scopeSchema,
  profile: poolProfileSchema,
});
export type SetupState = z.output<typeof setupStateSchema>;
