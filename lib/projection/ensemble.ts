import { ledgerOf, type WaterAnalysis } from '@/lib/chemistry';
import { WaterRangeError } from '@/lib/errors';
import { measuredRange } from '@/lib/schemas/measured-range';
import { type JointName, jointOrder } from '@/lib/schemas/posterior';
import { choleskyFactor } from './cholesky';
import type { CourseSetting, CourseStart } from './integrate';
import { normalQuantile } from './normal';
import { type LearnableParameter, type Parameters, priorSigma } from './parameters';
import { type ReadingErrors, type UncertainQuantity, uncertainQuantities } from './reading-error';
import { sobolPoints } from './sobol';
import type { TabletLoad } from './tablets';

export const ENSEMBLE_SIZE = 64;

/** One pool that could be this one, given what is known. */
export type Member = { start: CourseStart; setting: CourseSetting };

/** How uncertain each learnable parameter is: sigma of its logarithm. */
export type ParameterSigmas = Partial<Record<LearnableParameter, number>>;

/** Fixed digital shifts: multiples of the golden ratio, whose digits have no pattern. */
const shifts = jointOrder.map((_, coordinate) => Math.imul(coordinate + 1, 0x9e3779b9) >>> 0);

export type EnsembleOptions = {
  /** Number of members; the product's bands use 64. */
  size?: number;
  /** Sigmas of the parameters' logarithms; the prior's where left out. */
  sigmas?: ParameterSigmas;
  /**
   * Joint covariance of the parameters' logarithms and the water, as a posterior carries it; it takes the place of
   * `sigmas` and of the reading's errors, and belongs about the posterior's own medians and water.
   */
  covariance?: readonly (readonly number[])[];
};

/**
 * The ensemble: the same Sobol points for every candidate plan, so that plans differ and luck does not. Parameters are
 * log-normal about their medians, readings normal about what was read and held inside what the model permits. Where the
 * drawn alkalinity cannot carry the drawn pH, the read one is taken.
 *
 * Without a joint covariance all of them are independent. With one, point z becomes the deviation L z, L being its
 * Cholesky factor: what a pool has taught of the sum of two losses holds, however little it says of each.
 *
 * Errors: RangeError for a covariance that is not positive definite.
 */
export function ensembleOf(
  water: WaterAnalysis,
  errors: ReadingErrors,
  loads: readonly TabletLoad[],
  setting: CourseSetting,
  { size = ENSEMBLE_SIZE, sigmas = priorSigma, covariance }: EnsembleOptions = {},
): Member[] {
  const spread = covariance ? jointSpread(covariance) : independentSpread(errors, sigmas);
  return sobolPoints(size, jointOrder.length, shifts).map((point) => {
    const deviations = spread(point.map(normalQuantile));
    const parameters: Parameters = { ...setting.parameters };
    const drawn = { ...water };
    jointOrder.forEach((name, coordinate) => {
      const deviation = deviations[coordinate]!;
      if (isQuantity(name)) {
        const [low, high] = measuredRange[name];
        drawn[name] = Math.min(high, Math.max(low, water[name] + deviation));
      } else parameters[name] *= Math.exp(deviation);
    });
    return { start: { ledger: ledgerOfDrawn(drawn, water), loads }, setting: { ...setting, parameters } };
  });
}

type Spread = (normal: readonly number[]) => readonly number[];

function independentSpread(errors: ReadingErrors, sigmas: ParameterSigmas): Spread {
  const each = jointOrder.map((name) => (isQuantity(name) ? errors[name] : (sigmas[name] ?? priorSigma[name])));
  return (normal) => normal.map((value, coordinate) => each[coordinate]! * value);
}

function jointSpread(covariance: readonly (readonly number[])[]): Spread {
  const factor = choleskyFactor(covariance);
  return (normal) =>
    factor.map((row, coordinate) => {
      let sum = 0;
      for (let term = 0; term <= coordinate; term++) sum += row[term]! * normal[term]!;
      return sum;
    });
}

/** Whether a name of the joint order is one of the water, not a parameter. */
export function isQuantity(name: JointName): name is UncertainQuantity {
  return (uncertainQuantities as readonly string[]).includes(name);
}

function ledgerOfDrawn(drawn: WaterAnalysis, read: WaterAnalysis) {
  try {
    return ledgerOf(drawn);
  } catch (error) {
    if (!(error instanceof WaterRangeError)) throw error;
    return ledgerOf({
      ...drawn,
      pH: read.pH,
      totalAlkalinity: read.totalAlkalinity,
      cyanuricAcid: read.cyanuricAcid,
      freeChlorine: read.freeChlorine,
    });
  }
}
