import { z } from 'zod';
import { measuredRange } from './measured-range';
import { instantSchema } from './time';

/** What a pool can teach beside its water: the starred parameters of the engine. */
export const learnableParameters = [
  'boundPhotolysis',
  'sunStrength',
  'darkDemand',
  'chlorinePerSwimmerHour',
  'tabletLife',
  'waterPerSwimmerHour',
  'carbonDioxideTransfer',
  'volume',
] as const;
export type LearnableParameter = (typeof learnableParameters)[number];

/** The measured quantities whose error belongs to the model. */
export const uncertainQuantities = [
  'freeChlorine',
  'pH',
  'totalAlkalinity',
  'calciumHardness',
  'cyanuricAcid',
] as const;
export type UncertainQuantity = (typeof uncertainQuantities)[number];

/**
 * Rows and columns of a joint covariance: parameters by the logarithm of what they are, water in its own units. What
 * chlorine hangs on most comes first, because the first coordinates of the ensemble's points are spread best.
 */
export const jointOrder = [
  'sunStrength',
  'freeChlorine',
  'darkDemand',
  'cyanuricAcid',
  'tabletLife',
  'volume',
  'boundPhotolysis',
  'pH',
  'chlorinePerSwimmerHour',
  'carbonDioxideTransfer',
  'totalAlkalinity',
  'waterPerSwimmerHour',
  'calciumHardness',
] as const satisfies readonly (LearnableParameter | UncertainQuantity)[];
export type JointName = (typeof jointOrder)[number];

const everyParameter = <Value extends z.ZodType>(value: Value) => z.record(z.enum(learnableParameters), value);
const finite = z.number();
const vector = z.array(finite).length(jointOrder.length);
const matrix = z.array(vector).length(jointOrder.length);

const quantity = (name: keyof typeof measuredRange) =>
  z.number().min(measuredRange[name][0]).max(measuredRange[name][1]);

const filteredWaterSchema = z.strictObject({
  freeChlorine: quantity('freeChlorine'),
  combinedChlorine: quantity('combinedChlorine'),
  pH: quantity('pH'),
  totalAlkalinity: quantity('totalAlkalinity'),
  calciumHardness: quantity('calciumHardness'),
  cyanuricAcid: quantity('cyanuricAcid'),
  temperature: quantity('temperature'),
  dissolvedSolids: z.number().min(0).max(30000),
});

const tabletsSchema = z.strictObject({
  tabletMass: z.number().gt(0),
  count: z.number().gt(0),
  strength: z.number().min(0).max(100),
});

/** What a pool has taught up to one of its readings. */
export const posteriorSchema = z.strictObject({
  readingAt: instantSchema,
  /** Median of each parameter, in its units; volume within 15 % of the entered one. */
  medians: everyParameter(z.number().gt(0)),
  /** Sigma of each parameter's logarithm. */
  sigmas: everyParameter(z.number().gt(0)),
  /** In the order of `jointOrder`. */
  covariance: matrix,
  /** The volume that was learnt lies further off than it may be used: the pool is to be measured again. */
  volumeBeyondReach: z.boolean(),
  /** The water at the reading, by everything read and dosed so far; what is questioned stands as it was read. */
  water: filteredWaterSchema,
  questioned: z.array(z.enum(uncertainQuantities)),
  /** What is left in the feeder by the learnt life. */
  loads: z.array(tabletsSchema.extend({ erodedShare: z.number().min(0).max(1) })),
  /** How many readings made each parameter clearer. */
  readingsThatCounted: everyParameter(z.number().int().min(0)),
});
export type Posterior = z.infer<typeof posteriorSchema>;

/** What the filter knows after a reading: enough to go on from there. Plain numbers, the same after a trip through JSON. */
export const filterStateSchema = z.strictObject({
  /** Instant of the reading [ms]. */
  at: z.number(),
  /** In the order of `jointOrder`: parameters as sigmas of their prior away from its median, water in its units. */
  mean: vector,
  covariance: matrix,
  combinedChlorine: quantity('combinedChlorine'),
  temperature: quantity('temperature'),
  dissolvedSolids: z.number().min(0).max(30000),
  /** Tablets in the feeder, with the running hours that water has passed them [h]. */
  loads: z.array(tabletsSchema.extend({ runningHours: z.number().min(0) })),
  /** Which way a questioned quantity of the newest reading lay: a second one that way is believed. */
  doubts: z.partialRecord(z.enum(uncertainQuantities), z.union([z.literal(1), z.literal(-1)])),
  readingsThatCounted: everyParameter(z.number().int().min(0)),
});
export type FilterState = z.infer<typeof filterStateSchema>;

const expectedSchema = z.strictObject({ p10: finite, p50: finite, p90: finite });

/** What became of one measured value, or of a stretch of time. */
export const learningNoteSchema = z.discriminatedUnion('kind', [
  /**
   * `counted` in full, `questioned`: weighs less or nothing, `believed`: a second reading says the same,
   * `unrecorded-dose`: it says that there is more chlorine than can be left of what was recorded.
   */
  z.strictObject({
    kind: z.enum(['counted', 'questioned', 'believed', 'unrecorded-dose']),
    quantity: z.enum([...uncertainQuantities, 'tabletsLeft']),
    measured: finite,
    expected: expectedSchema,
    weight: z.number().min(0).max(1),
  }),
  /** The water starts anew: no reading before, too long without one, or what was recorded cannot have been. */
  z.strictObject({ kind: z.literal('fresh-start'), reason: z.enum(['first-reading', 'long-gap', 'impossible-water']) }),
  z.strictObject({ kind: z.literal('left-out'), reason: z.enum(['duplicate', 'out-of-range']) }),
]);
export type LearningNote = z.infer<typeof learningNoteSchema>;

/** One reading's step: what is stored with it. */
export const posteriorStepSchema = z.strictObject({
  readingAt: instantSchema,
  state: filterStateSchema,
  posterior: posteriorSchema,
  log: z.array(learningNoteSchema),
});
export type PosteriorStep = z.infer<typeof posteriorStepSchema>;
