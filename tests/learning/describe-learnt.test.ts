import { describe, expect, it } from 'vitest';
import { describeLearnt, learnFrom, learnPool } from '@/lib/learning';
import { posteriorOf } from '@/lib/learning/posterior-of';
import { parametersOf } from '@/lib/projection/parameters';
import { jointOrder, learnableParameters } from '@/lib/schemas/posterior';
import { simulatedPool } from './simulated-pools';

const { pool, history } = simulatedPool(21, 9);
const posterior = learnPool(history)!;
const described = describeLearnt(posterior, pool);
const of = (name: string) => described.parameters.find(({ parameter }) => parameter === name)!;

describe('what a pool has taught, for people', () => {
  it('names every parameter once, the prior in units of the trade beside what was learnt', () => {
    expect(described.parameters.map(({ parameter }) => parameter)).toEqual([...learnableParameters]);
    expect(of('darkDemand')).toMatchObject({ unit: 'percent-per-day' });
    expect(of('darkDemand').prior.p50).toBeCloseTo(10, 9);
    expect(of('darkDemand').prior.p90).toBeCloseTo(10 * Math.exp(1.2816 * 0.5), 3);
    expect(of('boundPhotolysis').prior.p50).toBeCloseTo(0.6, 9);
    expect(of('carbonDioxideTransfer').prior.p50).toBeCloseTo(0.9, 9);
    expect(of('volume').prior.p50).toBeCloseTo(pool.volume, 9);
    for (const { parameter, learnt } of described.parameters)
      expect(learnt.p90 / learnt.p50).toBeCloseTo(Math.exp(1.2816 * posterior.sigmas[parameter]), 3);
  });

  it('calls clear what is clear, and counts the readings that made it so', () => {
    expect(of('darkDemand').clear).toBe(posterior.sigmas.darkDemand <= 0.375);
    const first = describeLearnt(learnFrom(null, history)[0]!.posterior, pool);
    for (const { clear, readingsThatCounted, prior, learnt } of first.parameters) {
      expect({ clear, readingsThatCounted }).toEqual({ clear: false, readingsThatCounted: 0 });
      expect(learnt.p50).toBeCloseTo(prior.p50, 9);
    }
    expect(described.parameters.some(({ clear }) => clear)).toBe(true);
    for (const { readingsThatCounted } of described.parameters) expect(readingsThatCounted).toBeLessThan(9);
  });

  it('tells the daily loss with its ranges, the learnt one narrower', () => {
    const { prior, learnt } = described.dailyLoss;
    for (const { p10, p50, p90 } of [prior, learnt]) {
      expect(p10).toBeGreaterThan(0);
      expect(p50).toBeGreaterThan(p10);
      expect(p90).toBeGreaterThan(p50);
      expect(p90).toBeLessThan(3);
    }
    expect(learnt.p90 - learnt.p10).toBeLessThan(prior.p90 - prior.p10);
  });

  it.each([
    [0.5, 1, false],
    [1.3, 1, false],
    [1.5, 1.15, true],
    [-2, 0.85, true],
  ])('uses a volume learnt as exp(%d x 0.1) of the entered one within 15 %', (sigmas, share, beyond) => {
    const { state } = learnFrom(null, history).at(-1)!;
    const mean = state.mean.with(jointOrder.indexOf('volume'), sigmas);
    const taught = posteriorOf({ ...state, mean }, history.readings.at(-1)!, parametersOf(pool));
    const learnt = pool.volume * Math.exp(0.1 * sigmas);
    expect(taught.medians.volume).toBeCloseTo(beyond ? share * pool.volume : learnt, 9);
    expect(describeLearnt(taught, pool).measureVolumeAgain).toBe(beyond);
  });

  it('learns that a pool is larger than entered from doses that do less than they should', () => {
    const wrong = { ...pool, volume: 0.75 * pool.volume };
    const learnt = learnPool({ ...history, pool: wrong })!;
    expect(learnt.medians.volume).toBeGreaterThan(1.02 * wrong.volume);
  });
});
