import type { Parameters } from '@/lib/projection/parameters';
import { priorSigma } from '@/lib/projection/parameters';
import { isQuantity } from '@/lib/projection/ensemble';
import { middleOf } from '@/lib/projection/reading-error';
import type { Reading } from '@/lib/schemas/reading';
import { type FilterState, jointOrder, type Posterior, uncertainQuantities } from '@/lib/schemas/posterior';
import { loadsAtLife } from './feeder';
import { errorOf } from './measurement';
import { possibleWater } from './possible-water';
import { forEveryParameter, held, parametersAt, placeOf, waterAt } from './state';

/** A learnt volume is used within this share of the entered one; beyond, the pool is to be measured again (care rules). */
export const VOLUME_REACH = 0.15;

/**
 * What is stored and planned with. Parameters come out by the logarithm; a quantity that is questioned stands as it was
 * read and as sure as the test is, so that nobody's sheet starts from water that contradicts the test in their hand.
 *
 * @param usual the medians of this pool's priors, its entered volume among them
 */
export function posteriorOf(state: FilterState, reading: Reading, usual: Parameters): Posterior {
  const scale = jointOrder.map((name) => (isQuantity(name) ? 1 : priorSigma[name]));
  const covariance = state.covariance.map((row, at) => row.map((value, other) => value * (scale[at]! * scale[other]!)));
  const parameters = parametersAt(state.mean, usual);
  const water = waterAt(state.mean, state);
  const questioned = uncertainQuantities.filter(
    (quantity) => state.doubts[quantity] && reading[quantity] !== undefined,
  );
  for (const quantity of questioned) {
    const value = reading[quantity]!;
    const place = placeOf[quantity];
    water[quantity] = middleOf(value);
    for (let other = 0; other < jointOrder.length; other++) covariance[place]![other] = covariance[other]![place] = 0;
    covariance[place]![place] = errorOf(quantity, value, reading.method, middleOf(value)) ** 2;
  }
  return {
    readingAt: reading.takenAt,
    medians: forEveryParameter((name) =>
      name === 'volume' ? heldVolume(parameters.volume, usual.volume) : parameters[name],
    ),
    sigmas: forEveryParameter((name) => Math.sqrt(covariance[placeOf[name]]![placeOf[name]]!)),
    covariance,
    volumeBeyondReach: heldVolume(parameters.volume, usual.volume) !== parameters.volume,
    water: possibleWater(water),
    questioned,
    loads: loadsAtLife(state.loads, parameters.tabletLife).filter(({ erodedShare }) => erodedShare < 1),
    readingsThatCounted: { ...state.readingsThatCounted },
  };
}

function heldVolume(learnt: number, entered: number): number {
  return held(learnt, entered * (1 - VOLUME_REACH), entered * (1 + VOLUME_REACH));
}
