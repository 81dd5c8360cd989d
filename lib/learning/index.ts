import { parseInstant } from '@/lib/calendar/wall-time';
import type { FilterState, Posterior, PosteriorStep } from '@/lib/schemas/posterior';
import type { Dated, PoolHistory, TabletsLeft } from './history';
import { readingsInOrder } from './readings-in-order';
import { stepTo } from './step';

export { describeLearnt, type LearntDescription, type LearntParameter } from './describe-learnt';
export type { DayConditions, PoolHistory, TabletsLeft } from './history';

/**
 * What a pool has taught by its newest reading; null without any reading. Scaled unscented Kalman filter over the
 * logarithms of the parameters and the water together, see {@link learnFrom}.
 */
export function learnPool(history: PoolHistory): Posterior | null {
  return learnFrom(null, history).at(-1)?.posterior ?? null;
}

/**
 * One step for every reading after a state: the projection carries what is known to the reading, the reading corrects it.
 * Start from the state stored with the newest reading older than the one that is new, edited or deleted: what comes out is
 * then the same as from the beginning, to the last digit.
 *
 * What cannot be is left out and written into the step's log. Tablets found in the feeder count with the reading that
 * follows them. An exact duplicate of a reading counts once.
 *
 * @param from a stored state, or null for the beginning
 * @param history what happened since; what lies before the state may be in it
 * Errors: invalid-input for a pool whose fill water or time zone cannot be.
 * Uncertainty: on simulated pools with drop kits the true daily loss lies in the 80 % range in about 80 % (tested).
 * Source: S. J. Julier, J. K. Uhlmann 1997; E. A. Wan, R. van der Merwe 2000; weights of surprises: F. R. Hampel 1974.
 */
export function learnFrom(from: FilterState | null, history: PoolHistory): PosteriorStep[] {
  const steps: PosteriorStep[] = [];
  const found = datedTablets(history.tabletsLeft);
  let state = from;
  for (const { at, what, log } of readingsInOrder(history.readings, from?.at ?? -Infinity)) {
    const step = stepTo(state, at, what, history, found, log);
    steps.push(step);
    state = step.state;
  }
  return steps;
}

function datedTablets(tabletsLeft: readonly TabletsLeft[]): Dated<TabletsLeft>[] {
  return tabletsLeft
    .flatMap((what) => {
      const at = parseInstant(what.at);
      return at === undefined || !(what.tablets >= 0 && what.tablets < Infinity) ? [] : [{ at, what }];
    })
    .sort((a, b) => a.at - b.at || a.what.tablets - b.what.tablets);
}
