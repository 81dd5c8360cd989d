import { describe, expect, it } from 'vitest';
import { drift } from '@/lib/learning/drift';
import { choleskyFactor } from '@/lib/projection/cholesky';
import { jointOrder } from '@/lib/schemas/posterior';

const dark = jointOrder.indexOf('darkDemand');
const chlorine = jointOrder.indexOf('freeChlorine');
const stabilizer = jointOrder.indexOf('cyanuricAcid');

/** A pool whose dark demand is known within a fifth of its prior, and goes with the chlorine. */
function known() {
  const covariance = jointOrder.map((_, row) => jointOrder.map((__, column): number => (row === column ? 0.04 : 0)));
  covariance[dark]![chlorine] = covariance[chlorine]![dark] = -0.02;
  return { mean: jointOrder.map((_, place) => (place === dark ? 1 : 0)), covariance };
}

describe('time alone', () => {
  it('takes what was learnt back to the prior, and never beyond it', () => {
    const state = known();
    drift(state, 3000);
    expect(state.mean[dark]).toBeCloseTo(Math.exp(-1), 12);
    expect(state.covariance[dark]![dark]).toBeCloseTo(1 - 0.96 * Math.exp(-2), 12);
    drift(state, 1e6);
    expect(state.mean[dark]).toBeCloseTo(0, 12);
    expect(state.covariance[dark]![dark]).toBeCloseTo(1, 12);
    expect(state.covariance[dark]![chlorine]).toBeCloseTo(0, 12);
  });

  it('says the same of two days in one step or in two, chlorine apart', () => {
    const [once, twice] = [known(), known()];
    drift(once, 2);
    drift(twice, 1);
    drift(twice, 1);
    once.covariance.forEach((row, at) =>
      row.forEach((value, other) => expect(twice.covariance[at]![other]!).toBeCloseTo(value, 12)),
    );
  });

  it('makes water less sure by the square root of the days, chlorine no longer than two', () => {
    const gained = (place: number, days: number) => {
      const state = known();
      drift(state, days);
      return state.covariance[place]![place]! - 0.04;
    };
    expect(gained(stabilizer, 8)).toBeCloseTo(8 * gained(stabilizer, 1), 12);
    expect(gained(chlorine, 20)).toBeCloseTo(2 * gained(chlorine, 1), 12);
    expect(gained(chlorine, 1)).toBeGreaterThan(0);
  });

  it('leaves a covariance one', () => {
    const state = known();
    drift(state, 50);
    expect(() => choleskyFactor(state.covariance)).not.toThrow();
  });
});
