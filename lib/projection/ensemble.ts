import { ledgerOf, type WaterAnalysis } from '@/lib/chemistry';
import { WaterRangeError } from '@/lib/errors';
import { measuredRange } from '@/lib/schemas/measured-range';
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

/** What each coordinate of a point stands for. The first ones are spread best: what chlorine hangs on most comes first. */
const coordinates = [
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

/** Fixed digital shifts: multiples of the golden ratio, whose digits have no pattern. */
const shifts = coordinates.map((_, coordinate) => Math.imul(coordinate + 1, 0x9e3779b9) >>> 0);

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
  return sobolPoints(size, coordinates.length, shifts).map((point) => {
    const parameters: Parameters = { ...setting.parameters };
    const drawn = { ...water };
    coordinates.forEach((name, coordinate) => {
      const deviation = normalQuantile(point[coordinate]!);
      if (isReading(name)) {
        const [low, high] = measuredRange[name];
        drawn[name] = Math.min(high, Math.max(low, water[name] + errors[name] * deviation));
      } else parameters[name] *= Math.exp((sigmas[name] ?? priorSigma[name]) * deviation);
    });
    return { start: { ledger: ledgerOfDrawn(drawn, water), loads }, setting: { ...setting, parameters } };
  });
}

function isReading(name: (typeof coordinates)[number]): name is UncertainQuantity {
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
