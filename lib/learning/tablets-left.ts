import { priorSigma } from '@/lib/projection/parameters';
import type { FilterState, LearningNote } from '@/lib/schemas/posterior';
import { expectedBand } from './assimilate';
import { type FeederLoad, tabletsWorth } from './feeder';
import { hampelWeight, QUESTIONED_BELOW } from './hampel';
import { placeOf } from './state';

/** One sigma of what somebody sees in a feeder [tablets]: half a tablet; an assumption. */
export const EYE = 0.5;

/** Sigma points of one dimension, at the mean and sqrt(3) sigmas on either side. */
const points = [
  { at: 0, weight: 2 / 3 },
  { at: Math.sqrt(3), weight: 1 / 6 },
  { at: -Math.sqrt(3), weight: 1 / 6 },
] as const;

/**
 * Takes what was found in the feeder into what is known. How much is left follows from the tablets' life alone, so the
 * unscented transform of one dimension is enough; all that goes with the life moves along. Changes `state`.
 *
 * @param loads   the feeder as it was then, in running hours
 * @param tablets whole tablets' worth that were found
 * @param usualLife the prior's median [h]
 */
export function learnFromTabletsLeft(
  state: FilterState,
  loads: readonly FeederLoad[],
  tablets: number,
  usualLife: number,
): LearningNote {
  const { mean, covariance } = state;
  const life = placeOf.tabletLife;
  const variance = covariance[life]![life]!;
  const deviation = Math.sqrt(variance);
  const worths = points.map(({ at, weight }) => {
    const u = mean[life]! + deviation * at;
    return { at: deviation * at, weight, worth: tabletsWorth(loads, usualLife * Math.exp(priorSigma.tabletLife * u)) };
  });
  const expected = worths.reduce((sum, { weight, worth }) => sum + weight * worth, 0);
  const spread = worths.reduce((sum, { weight, worth }) => sum + weight * (worth - expected) ** 2, 0);
  const together = worths.reduce((sum, { at, weight, worth }) => sum + weight * at * (worth - expected), 0);
  const total = spread + EYE ** 2;
  const weight = hampelWeight((tablets - expected) / Math.sqrt(total));

  const along = covariance[life]!.map((value) => (value / variance) * together);
  for (let row = 0; row < mean.length; row++) {
    mean[row]! += (weight * along[row]! * (tablets - expected)) / total;
    for (let column = 0; column < mean.length; column++)
      covariance[row]![column]! -= (weight / total) * (along[row]! * along[column]!);
  }
  return {
    kind: weight < QUESTIONED_BELOW ? 'questioned' : 'counted',
    quantity: 'tabletsLeft',
    measured: tablets,
    expected: expectedBand(expected, Math.sqrt(total)),
    weight,
  };
}
