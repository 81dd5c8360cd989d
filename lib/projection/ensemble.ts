import { ledgerOf, type WaterAnalysis } from '@/lib/chemistry';
import { WaterRangeError } from '@/lib/errors';
import { measuredRange } from '@/lib/schemas/measured-range';
import type { CourseSetting, CourseStart } from './integrate';
import { normalQuantile } from './normal';
import { type LearnableParameter, type Parameters, priorSigma } from './parameters';
import { type ReadingErrors, uncertainQuantities } from './reading-error';
import { sobolPoints } from './sobol';
import type { TabletLoad } from './tablets';

export const ENSEMBLE_SIZE = 64;

/** One pool that could be this one, given what is known. */
export type Member = { start: CourseStart; setting: CourseSetting };

/** How uncertain each learnable parameter is: sigma of its logarithm. */
export type ParameterSigmas = Partial<Record<LearnableParameter, number>>;

const parameterNames = Object.keys(priorSigma) as LearnableParameter[];

/**
 * The ensemble: the same Sobol points for every candidate plan, so that plans differ and luck does not. Parameters are
 * log-normal about their medians, readings normal about what was read and held inside what the model permits. Where the
 * drawn alkalinity cannot carry the drawn pH, the read one is taken.
 *
 * @param size    number of members; the product's bands use 64
 * @param sigmas  of the logarithms; the prior's where left out
 */
export function ensembleOf(
  water: WaterAnalysis,
  errors: ReadingErrors,
  loads: readonly TabletLoad[],
  setting: CourseSetting,
  { size = ENSEMBLE_SIZE, sigmas = priorSigma }: { size?: number; sigmas?: ParameterSigmas } = {},
): Member[] {
  const points = sobolPoints(size, parameterNames.length + uncertainQuantities.length);
  return points.map((point) => {
    const deviation = (coordinate: number) => normalQuantile(point[coordinate]!);
    const parameters: Parameters = { ...setting.parameters };
    parameterNames.forEach((name, coordinate) => {
      parameters[name] *= Math.exp((sigmas[name] ?? priorSigma[name]) * deviation(coordinate));
    });
    const drawn = { ...water };
    uncertainQuantities.forEach((quantity, index) => {
      const [low, high] = measuredRange[quantity];
      const value = water[quantity] + errors[quantity] * deviation(parameterNames.length + index);
      drawn[quantity] = Math.min(high, Math.max(low, value));
    });
    return { start: { ledger: ledgerOfDrawn(drawn, water), loads }, setting: { ...setting, parameters } };
  });
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
