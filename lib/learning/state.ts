import type { WaterAnalysis } from '@/lib/chemistry';
import { isQuantity } from '@/lib/projection/ensemble';
import { type Parameters, priorSigma } from '@/lib/projection/parameters';
import { measuredRange } from '@/lib/schemas/measured-range';
import {
  type FilterState,
  type JointName,
  jointOrder,
  type LearnableParameter,
  learnableParameters,
} from '@/lib/schemas/posterior';

/** Where each name stands in mean and covariance. */
export const placeOf = Object.fromEntries(jointOrder.map((name, place) => [name, place])) as Record<JointName, number>;

export const parameterPlaces = jointOrder.flatMap((name, place) => (isQuantity(name) ? [] : [place]));
export const waterPlaces = jointOrder.flatMap((name, place) => (isQuantity(name) ? [place] : []));

/** Parameters further from their prior's median than this many of its sigmas are not believed. */
const FURTHEST = 6;

/**
 * The parameters of a point of the filter's space: each is usual * exp(sigma of its prior * u).
 *
 * @param usual the medians of this pool's priors
 */
export function parametersAt(point: ArrayLike<number>, usual: Parameters): Parameters {
  const parameters = { ...usual };
  for (const name of learnableParameters)
    parameters[name] *= Math.exp(priorSigma[name] * held(point[placeOf[name]]!, -FURTHEST, FURTHEST));
  return parameters;
}

/** The water of a point of the filter's space, held inside what the model permits. */
export function waterAt(
  point: ArrayLike<number>,
  { combinedChlorine, temperature, dissolvedSolids }: FilterState,
): WaterAnalysis & Required<Pick<WaterAnalysis, 'combinedChlorine' | 'dissolvedSolids'>> {
  const value = (name: keyof typeof measuredRange & JointName) => {
    const [low, high] = measuredRange[name];
    return held(point[placeOf[name]]!, low, high);
  };
  return {
    freeChlorine: value('freeChlorine'),
    combinedChlorine,
    pH: value('pH'),
    totalAlkalinity: value('totalAlkalinity'),
    calciumHardness: value('calciumHardness'),
    cyanuricAcid: value('cyanuricAcid'),
    temperature,
    dissolvedSolids,
  };
}

export function held(value: number, low: number, high: number): number {
  return Math.min(high, Math.max(low, value));
}

/** The same value for every parameter. */
export function forEveryParameter<Value>(
  value: (name: LearnableParameter) => Value,
): Record<LearnableParameter, Value> {
  return Object.fromEntries(learnableParameters.map((name) => [name, value(name)])) as Record<
    LearnableParameter,
    Value
  >;
}
